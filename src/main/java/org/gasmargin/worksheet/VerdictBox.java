package org.gasmargin.worksheet;

import java.util.List;
import org.gasmargin.rules.Verdict;
import org.gasmargin.worksheet.layout.Block;
import org.gasmargin.worksheet.layout.Canvas;
import org.gasmargin.worksheet.layout.Element;
import org.gasmargin.worksheet.layout.Fonts;
import org.gasmargin.worksheet.layout.Piece;
import org.gasmargin.worksheet.layout.Stroke;
import org.gasmargin.worksheet.layout.Style;

/**
 * The verdict word, large, in a frame that tells the verdicts apart without colour: black for over
 * the limit, hatched for a short margin, dashed for not assessed, plain for within limits.
 *
 * @param verdict the word
 */
record VerdictBox(Verdict verdict) implements Block {
  private static final float HEIGHT = 40;
  private static final float EDGE = 9;

  @Override
  public List<Piece> lay(Element parent, Fonts fonts, float width) {
    Element element = parent.child("P");
    float size = 19;
    while (size > 9 && fonts.width(verdict.words(), new Style(true, size, 0)) > width - 26) {
      size -= 0.5f;
    }
    Style style = new Style(true, size, verdict == Verdict.OVER_LIMIT ? 1 : 0);
    return List.of(
        Piece.of(
            HEIGHT,
            (page, x, top) -> {
              page.artifact(canvas -> frame(canvas, x, top, width));
              page.tagged(
                  element,
                  canvas ->
                      canvas.text(
                          verdict.words(),
                          x + width / 2,
                          top + HEIGHT / 2 + style.size() * 0.36f,
                          style,
                          Canvas.Anchor.CENTRE));
            }));
  }

  private void frame(Canvas canvas, float x, float top, float width) {
    switch (verdict) {
      case OVER_LIMIT -> canvas.fill(x, top, width, HEIGHT, 0);
      case MARGIN_SHORT -> {
        Stroke lines = Stroke.solid(0.8f, 0);
        canvas.hatch(x, top, EDGE, HEIGHT, 4, lines);
        canvas.hatch(x + width - EDGE, top, EDGE, HEIGHT, 4, lines);
        canvas.outline(x, top, width, HEIGHT, Stroke.solid(1.6f, 0));
      }
      case NOT_ASSESSED -> canvas.outline(x, top, width, HEIGHT, Stroke.dashed(1.6f, 5f, 3f));
      case WITHIN_LIMITS -> canvas.outline(x, top, width, HEIGHT, Stroke.solid(1.6f, 0));
    }
  }
}
