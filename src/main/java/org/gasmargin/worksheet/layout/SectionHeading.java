package org.gasmargin.worksheet.layout;

import java.util.List;

/**
 * The heading of a section over a rule.
 *
 * @param text the heading
 */
record SectionHeading(String text) implements Block {
  private static final float BELOW = 2.5f;

  @Override
  public List<Piece> lay(Element parent, Fonts fonts, float width) {
    Piece words =
        new Paragraph("H2", List.of(new Run(text, Style.SECTION)), true)
            .lay(parent, fonts, width)
            .get(0);
    float height = words.height() + BELOW;
    return List.of(
        Piece.of(
                height,
                (page, x, top) -> {
                  words.painter().paint(page, x, top);
                  page.artifact(
                      canvas ->
                          canvas.line(
                              x, top + height, x + width, top + height, Stroke.solid(1, 0)));
                })
            .keptWithNext());
  }
}
