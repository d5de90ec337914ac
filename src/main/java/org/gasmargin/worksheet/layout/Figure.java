package org.gasmargin.worksheet.layout;

import java.util.List;

/**
 * A drawing with the text that stands for it.
 *
 * @param height pt
 * @param alternative what a reader who cannot see it needs to know
 * @param drawing draws it
 */
public record Figure(float height, String alternative, Drawing drawing) implements Block {
  /** Draws a figure. */
  public interface Drawing {
    /** Draws inside a rectangle and nowhere else. */
    void draw(Canvas canvas, float x, float top, float width, float height);
  }

  @Override
  public List<Piece> lay(Element parent, Fonts fonts, float width) {
    Element element = parent.child("Figure").alternative(fonts.drawable(alternative));
    return List.of(
        Piece.of(
            height,
            (page, x, top) ->
                page.figure(
                    element,
                    x,
                    top,
                    width,
                    height,
                    canvas -> drawing.draw(canvas, x, top, width, height))));
  }
}
