package org.gasmargin.worksheet.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Flowing text. Short paragraphs stay on one page, long ones may break between lines.
 *
 * @param type structure type, {@code P} or a heading
 * @param runs the text
 * @param keepsWithNext whether what follows must stand on the same page
 */
public record Paragraph(String type, List<Run> runs, boolean keepsWithNext) implements Block {
  private static final int LINES_HELD_TOGETHER = 8;

  /** Copies the list. */
  public Paragraph {
    runs = List.copyOf(runs);
  }

  /** A paragraph in one style. */
  public static Paragraph of(String text, Style style) {
    return new Paragraph("P", List.of(new Run(text, style)), false);
  }

  /** A paragraph of several styles. */
  public static Paragraph of(Run... runs) {
    return new Paragraph("P", List.of(runs), false);
  }

  /** The heading of a part of a section, held together with what follows. */
  public static Paragraph subsection(String text) {
    return new Paragraph("H3", List.of(new Run(text, Style.SUBSECTION)), true);
  }

  /** The same, held together with what follows. */
  public Paragraph keptWithNext() {
    return new Paragraph(type, runs, true);
  }

  @Override
  public List<Piece> lay(Element parent, Fonts fonts, float width) {
    Element element = parent.child(type);
    List<Piece> pieces = new ArrayList<>();
    List<LineBreaker.Line> lines = LineBreaker.lines(runs, fonts, width);
    for (int from = 0; from < lines.size(); from += LINES_HELD_TOGETHER) {
      List<LineBreaker.Line> held =
          lines.subList(from, Math.min(lines.size(), from + LINES_HELD_TOGETHER));
      boolean last = from + LINES_HELD_TOGETHER >= lines.size();
      pieces.add(
          new Piece(
              height(held),
              last && keepsWithNext,
              Optional.empty(),
              (page, x, top) -> page.tagged(element, canvas -> draw(held, canvas, x, top))));
    }
    return pieces;
  }

  static float height(List<LineBreaker.Line> lines) {
    float height = 0;
    for (LineBreaker.Line line : lines) {
      height += line.height();
    }
    return height;
  }

  static void draw(List<LineBreaker.Line> lines, Canvas canvas, float x, float top) {
    float y = top;
    for (LineBreaker.Line line : lines) {
      line.draw(canvas, x, y);
      y += line.height();
    }
  }
}
