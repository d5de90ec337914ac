package org.gasmargin.worksheet.layout;

import java.util.List;
import java.util.Optional;

/**
 * A cell of a table: text or a drawing.
 *
 * @param runs the text; empty for a drawing
 * @param figure the drawing, if it is one
 * @param span number of columns that it covers
 * @param rowHeader whether it names its row
 */
public record Cell(List<Run> runs, Optional<Figure> figure, int span, boolean rowHeader) {
  /** Copies the list. */
  public Cell {
    runs = List.copyOf(runs);
  }

  /** Plain text. */
  public static Cell of(String text) {
    return of(new Run(text, Style.TABLE));
  }

  /** Text of several styles. */
  public static Cell of(Run... runs) {
    return new Cell(List.of(runs), Optional.empty(), 1, false);
  }

  /** The name of the row. */
  public static Cell name(String text) {
    return new Cell(List.of(new Run(text, Style.TABLE.strong())), Optional.empty(), 1, true);
  }

  /** The name of the row where bold would be too much. */
  public static Cell plainName(String text) {
    return new Cell(List.of(new Run(text, Style.TABLE)), Optional.empty(), 1, true);
  }

  /** A drawing. */
  public static Cell of(Figure figure) {
    return new Cell(List.of(), Optional.of(figure), 1, false);
  }

  /** The same over several columns. */
  public Cell across(int columns) {
    return new Cell(runs, figure, columns, rowHeader);
  }
}
