package org.gasmargin.worksheet.layout;

import java.util.ArrayList;
import java.util.List;

/**
 * Blocks side by side, read column after column, never cut.
 *
 * @param columns the blocks of each column
 * @param shares part of the width that each column gets; they sum to 1
 * @param gutter space between columns, pt
 */
public record Columns(List<List<Block>> columns, List<Float> shares, float gutter)
    implements Block {
  /** Copies the lists. */
  public Columns {
    columns = List.copyOf(columns);
    shares = List.copyOf(shares);
  }

  @Override
  public List<Piece> lay(Element parent, Fonts fonts, float width) {
    float available = width - gutter * (columns.size() - 1);
    List<List<Piece>> laid = new ArrayList<>();
    float height = 0;
    for (int i = 0; i < columns.size(); i++) {
      List<Piece> pieces = new ArrayList<>();
      for (Block block : columns.get(i)) {
        pieces.addAll(block.lay(parent, fonts, available * shares.get(i)));
      }
      laid.add(pieces);
      height = Math.max(height, heightOf(pieces));
    }
    return List.of(
        Piece.of(
            height,
            (page, x, top) -> {
              float left = x;
              for (int i = 0; i < laid.size(); i++) {
                float y = top;
                for (Piece piece : laid.get(i)) {
                  piece.painter().paint(page, left, y);
                  y += piece.height();
                }
                left += available * shares.get(i) + gutter;
              }
            }));
  }

  private static float heightOf(List<Piece> pieces) {
    float sum = 0;
    for (Piece piece : pieces) {
      sum += piece.height();
    }
    return sum;
  }
}
