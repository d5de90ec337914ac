package org.gasmargin.worksheet.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A table with a head that is repeated on every page. A short table stays on one page. Rows are not
 * cut, except a row that is taller than {@value #LINES_HELD_TOGETHER} lines.
 *
 * @param columns at least one
 * @param rows each covers all columns
 */
public record Table(List<Column> columns, List<Row> rows) implements Block {
  /** Space left and right of a cell's text, pt. */
  static final float PADDING = 3;

  private static final float ABOVE = 1.3f;
  private static final float BELOW = 1.3f;
  private static final int LINES_HELD_TOGETHER = 30;
  private static final int ROWS_HELD_TOGETHER = 6;
  private static final Stroke HEAD_RULE = Stroke.solid(0.7f, 0.2f);

  /** Copies the lists and refuses rows that do not cover the columns. */
  public Table {
    columns = List.copyOf(columns);
    rows = List.copyOf(rows);
    for (Row row : rows) {
      if (row.cells().stream().mapToInt(Cell::span).sum() != columns.size()) {
        throw new IllegalArgumentException("a row must cover the columns: " + row);
      }
    }
  }

  /**
   * A row.
   *
   * @param cells from left to right
   * @param keptWithNext whether the next row explains this one and must stand on the same page
   */
  public record Row(List<Cell> cells, boolean keptWithNext) {
    /** Copies the list. */
    public Row {
      cells = List.copyOf(cells);
    }

    /** A row that stands for itself. */
    public static Row of(Cell... cells) {
      return new Row(List.of(cells), false);
    }
  }

  /** Where the text of a column stands. */
  public enum Align {
    LEFT,
    RIGHT
  }

  /**
   * A column.
   *
   * @param head its heading
   * @param align right for numbers, which then never wrap
   * @param fixedWidth pt; zero lets the content decide
   */
  public record Column(String head, Align align, float fixedWidth) {
    /** A column of text as wide as its content asks. */
    public static Column text(String head) {
      return new Column(head, Align.LEFT, 0);
    }

    /** A column of numbers as wide as its content asks. */
    public static Column numbers(String head) {
      return new Column(head, Align.RIGHT, 0);
    }

    /** The same with a width of its own, pt. */
    public Column wide(float width) {
      return new Column(head, align, width);
    }
  }

  @Override
  public List<Piece> lay(Element parent, Fonts fonts, float width) {
    Element table = parent.child("Table");
    List<Cell> head =
        columns.stream().map(c -> Cell.of(new Run(c.head(), Style.TABLE_HEAD))).toList();
    List<List<Cell>> all = new ArrayList<>();
    all.add(head);
    rows.forEach(row -> all.add(row.cells()));
    float[] widths = ColumnWidths.of(columns, all, fonts, width);

    LaidRow laidHead = layRow(table.child("THead").child("TR"), head, true, fonts, widths);
    Piece headPiece = headPiece(laidHead, width, true);
    List<Piece> pieces = new ArrayList<>();
    pieces.add(headPiece.keptWithNext());
    Optional<Piece> repeated = Optional.of(headPiece(laidHead, width, false));
    Element body = table.child("TBody");
    boolean whole = rows.size() <= ROWS_HELD_TOGETHER;
    for (int i = 0; i < rows.size(); i++) {
      Row row = rows.get(i);
      boolean held = row.keptWithNext() || (whole && i < rows.size() - 1);
      LaidRow laid = layRow(body.child("TR"), row.cells(), false, fonts, widths);
      for (int from = 0; from == 0 || from < laid.lineCount(); from += LINES_HELD_TOGETHER) {
        LaidRow part = laid.lines(from, from + LINES_HELD_TOGETHER);
        boolean ruled = !row.keptWithNext() && from + LINES_HELD_TOGETHER >= laid.lineCount();
        pieces.add(rowPiece(part, held, ruled, width, repeated));
      }
    }
    return pieces;
  }

  private LaidRow layRow(Element tr, List<Cell> row, boolean head, Fonts fonts, float[] widths) {
    List<LaidCell> cells = new ArrayList<>();
    int column = 0;
    float x = 0;
    for (Cell cell : row) {
      float cellWidth = 0;
      for (int i = 0; i < cell.span(); i++) {
        cellWidth += widths[column + i];
      }
      Element element = tr.child(head || cell.rowHeader() ? "TH" : "TD");
      if (head || cell.rowHeader()) {
        element.scope(head ? "Column" : "Row");
      }
      if (cell.span() > 1) {
        element.columnSpan(cell.span());
      }
      float inner = cellWidth - 2 * PADDING;
      Align align = cell.span() > 1 ? Align.LEFT : columns.get(column).align();
      Optional<Piece> drawing =
          cell.figure().map(figure -> figure.lay(element, fonts, inner).get(0));
      cells.add(
          new LaidCell(
              element,
              drawing.isPresent() ? List.of() : LineBreaker.lines(cell.runs(), fonts, inner),
              drawing,
              x + PADDING,
              inner,
              align));
      x += cellWidth;
      column += cell.span();
    }
    return new LaidRow(cells);
  }

  private static Piece headPiece(LaidRow row, float width, boolean tagged) {
    float height = row.height() + ABOVE + BELOW;
    return Piece.of(
        height,
        (page, x, top) -> {
          page.artifact(
              canvas -> {
                canvas.fill(x, top, width, height, 0.91f);
                canvas.line(x, top + height, x + width, top + height, HEAD_RULE);
                if (!tagged) {
                  row.cells().forEach(cell -> cell.drawText(canvas, x, cellTop(row, cell, top)));
                }
              });
          if (tagged) {
            row.cells().forEach(cell -> cell.draw(page, x, cellTop(row, cell, top)));
          }
        });
  }

  /** Headings stand at the bottom of the head. */
  private static float cellTop(LaidRow row, LaidCell cell, float top) {
    return top + ABOVE + row.height() - cell.height();
  }

  private static Piece rowPiece(
      LaidRow row, boolean held, boolean ruled, float width, Optional<Piece> repeated) {
    float height = row.height() + ABOVE + BELOW;
    return new Piece(
        height,
        held,
        repeated,
        (page, x, top) -> {
          if (ruled) {
            page.artifact(
                canvas -> canvas.line(x, top + height, x + width, top + height, Stroke.HAIRLINE));
          }
          row.cells().forEach(cell -> cell.draw(page, x, top + ABOVE));
        });
  }

  private record LaidRow(List<LaidCell> cells) {
    int lineCount() {
      return cells.stream().mapToInt(cell -> cell.lines().size()).max().orElse(0);
    }

    float height() {
      float height = 0;
      for (LaidCell cell : cells) {
        height = Math.max(height, cell.height());
      }
      return height;
    }

    LaidRow lines(int from, int to) {
      return new LaidRow(cells.stream().map(cell -> cell.lines(from, to)).toList());
    }
  }

  private record LaidCell(
      Element element,
      List<LineBreaker.Line> lines,
      Optional<Piece> drawing,
      float x,
      float width,
      Align align) {
    float height() {
      return drawing.map(Piece::height).orElseGet(() -> Paragraph.height(lines));
    }

    LaidCell lines(int from, int to) {
      return new LaidCell(
          element,
          lines.subList(Math.min(from, lines.size()), Math.min(to, lines.size())),
          from == 0 ? drawing : Optional.empty(),
          x,
          width,
          align);
    }

    void draw(Page page, float left, float top) {
      if (drawing.isPresent()) {
        drawing.get().painter().paint(page, left + x, top);
      } else if (!lines.isEmpty()) {
        page.tagged(element, canvas -> drawText(canvas, left, top));
      }
    }

    void drawText(Canvas canvas, float left, float top) {
      float y = top;
      for (LineBreaker.Line line : lines) {
        float shift = align == Align.RIGHT ? width - line.width() : 0;
        line.draw(canvas, left + x + shift, y);
        y += line.height();
      }
    }
  }
}
