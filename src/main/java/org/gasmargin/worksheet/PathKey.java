package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import org.gasmargin.worksheet.layout.Block;
import org.gasmargin.worksheet.layout.Element;
import org.gasmargin.worksheet.layout.Fonts;
import org.gasmargin.worksheet.layout.Piece;
import org.gasmargin.worksheet.layout.Stroke;
import org.gasmargin.worksheet.layout.Style;

/** Says once what the letters and dashes of the plots mean. */
final class PathKey implements Block {
  private static final float SAMPLE = 22;
  private static final float LINE = 11;

  private record Entry(String words, Stroke stroke) {}

  private static List<Entry> entries() {
    List<Entry> entries = new ArrayList<>();
    for (PathLook look : PathLook.ALL) {
      entries.add(new Entry(look.letter() + " " + look.words(), look.stroke()));
    }
    entries.add(new Entry("limit", Stroke.dashed(1f, 7f, 1.5f, 1.5f, 1.5f)));
    return entries;
  }

  @Override
  public List<Piece> lay(Element parent, Fonts fonts, float width) {
    List<Piece> pieces = new ArrayList<>();
    List<Entry> row = new ArrayList<>();
    float used = 0;
    for (Entry entry : entries()) {
      float needed = SAMPLE + fonts.width(entry.words(), Style.TABLE) + 12;
      if (used + needed > width && !row.isEmpty()) {
        pieces.add(piece(parent, fonts, List.copyOf(row)));
        row.clear();
        used = 0;
      }
      row.add(entry);
      used += needed;
    }
    pieces.add(piece(parent, fonts, List.copyOf(row)));
    return pieces;
  }

  private static Piece piece(Element parent, Fonts fonts, List<Entry> row) {
    List<Element> elements = row.stream().map(entry -> parent.child("P")).toList();
    return Piece.of(
            LINE,
            (page, x, top) -> {
              float left = x;
              for (int i = 0; i < row.size(); i++) {
                Entry entry = row.get(i);
                float at = left;
                page.artifact(
                    canvas -> canvas.line(at, top + 5, at + SAMPLE - 4, top + 5, entry.stroke()));
                page.tagged(
                    elements.get(i),
                    canvas -> canvas.text(entry.words(), at + SAMPLE, top + 8, Style.TABLE));
                left += SAMPLE + fonts.width(entry.words(), Style.TABLE) + 12;
              }
            })
        .keptWithNext();
  }
}
