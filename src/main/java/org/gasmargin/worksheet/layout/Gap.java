package org.gasmargin.worksheet.layout;

import java.util.List;

/**
 * Empty space between blocks.
 *
 * @param height pt
 */
public record Gap(float height) implements Block {
  @Override
  public List<Piece> lay(Element parent, Fonts fonts, float width) {
    return List.of(Piece.of(height, (page, x, top) -> {}).keptWithNext());
  }
}
