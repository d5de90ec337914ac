package org.gasmargin.worksheet.layout;

import java.util.ArrayList;
import java.util.List;

/**
 * Statements with an empty box each, for a person to tick.
 *
 * @param items the statements
 * @param style how they look
 */
public record TickList(List<String> items, Style style) implements Block {
  private static final float INDENT = 15;

  /** Copies the list. */
  public TickList {
    items = List.copyOf(items);
  }

  @Override
  public List<Piece> lay(Element parent, Fonts fonts, float width) {
    Element list = parent.child("L");
    List<Piece> pieces = new ArrayList<>();
    for (String item : items) {
      Element entry = list.child("LI");
      Element label = entry.child("Lbl");
      Element body = entry.child("LBody");
      List<LineBreaker.Line> lines =
          LineBreaker.lines(List.of(new Run(item, style)), fonts, width - INDENT);
      pieces.add(
          Piece.of(
              Paragraph.height(lines) + 2,
              (page, x, top) -> {
                page.tagged(
                    label, canvas -> canvas.text("☐", x, top + style.ascent() + 0.5f, style));
                page.tagged(body, canvas -> Paragraph.draw(lines, canvas, x + INDENT, top));
              }));
    }
    return pieces;
  }
}
