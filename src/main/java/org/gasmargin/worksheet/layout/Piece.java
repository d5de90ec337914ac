package org.gasmargin.worksheet.layout;

import java.util.Optional;

/**
 * A part of a block that no page break may cut.
 *
 * @param height pt
 * @param keepsWithNext whether the next piece must stand on the same page
 * @param repeated drawn above this piece if it comes first on a page: the head of a table
 * @param painter draws it
 */
public record Piece(
    float height, boolean keepsWithNext, Optional<Piece> repeated, Painter painter) {
  /** A piece that stands for itself. */
  public static Piece of(float height, Painter painter) {
    return new Piece(height, false, Optional.empty(), painter);
  }

  /** The same, held together with the next. */
  public Piece keptWithNext() {
    return new Piece(height, true, repeated, painter);
  }

  /** Draws a piece. */
  public interface Painter {
    /** Draws with the top left corner at a point of a page. */
    void paint(Page page, float x, float top);
  }
}
