package org.gasmargin.worksheet.layout;

import java.util.List;

/** Shares the width of a table out among its columns by what stands in them. */
final class ColumnWidths {
  private ColumnWidths() {}

  /**
   * The widths of columns, padding included, pt; they sum to {@code available}.
   *
   * @param rows head and body
   */
  static float[] of(
      List<Table.Column> columns, List<List<Cell>> rows, Fonts fonts, float available) {
    int count = columns.size();
    float[] least = new float[count];
    float[] wanted = new float[count];
    for (List<Cell> row : rows) {
      int column = 0;
      for (Cell cell : row) {
        if (cell.span() == 1) {
          float longestWord = LineBreaker.longestWord(cell.runs(), fonts);
          float whole = widthInOneLine(cell.runs(), fonts);
          boolean number = columns.get(column).align() == Table.Align.RIGHT;
          float padding = 2 * Table.PADDING;
          least[column] = Math.max(least[column], Math.min(longestWord, available / 3) + padding);
          wanted[column] = Math.max(wanted[column], (number ? longestWord : whole) + padding);
        }
        column += cell.span();
      }
    }
    for (int i = 0; i < count; i++) {
      float fixed = columns.get(i).fixedWidth();
      if (fixed > 0) {
        least[i] = fixed;
        wanted[i] = fixed;
      }
    }
    return share(columns, least, wanted, available);
  }

  private static float[] share(
      List<Table.Column> columns, float[] least, float[] wanted, float available) {
    float sumLeast = sum(least);
    float sumWanted = sum(wanted);
    float[] widths = new float[least.length];
    float growing = 0;
    for (int i = 0; i < widths.length; i++) {
      growing += columns.get(i).fixedWidth() > 0 ? 0 : wanted[i];
    }
    for (int i = 0; i < widths.length; i++) {
      if (sumLeast >= available) {
        widths[i] = least[i] * available / sumLeast;
      } else if (sumWanted > available) {
        float part = (available - sumLeast) / (sumWanted - sumLeast);
        widths[i] = least[i] + part * (wanted[i] - least[i]);
      } else if (growing > 0) {
        boolean grows = columns.get(i).fixedWidth() <= 0;
        widths[i] = wanted[i] + (grows ? (available - sumWanted) * wanted[i] / growing : 0);
      } else {
        widths[i] = wanted[i] * available / sumWanted;
      }
    }
    return widths;
  }

  private static float widthInOneLine(List<Run> runs, Fonts fonts) {
    float width = 0;
    float widest = 0;
    for (Run run : runs) {
      String[] lines = fonts.drawable(run.text()).split("\n", -1);
      for (int i = 0; i < lines.length; i++) {
        width = (i == 0 ? width : 0) + fonts.width(lines[i], run.style());
        widest = Math.max(widest, width);
      }
    }
    return widest;
  }

  private static float sum(float[] values) {
    float sum = 0;
    for (float value : values) {
      sum += value;
    }
    return sum;
  }
}
