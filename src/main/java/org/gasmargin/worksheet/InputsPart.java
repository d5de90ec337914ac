package org.gasmargin.worksheet;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.gasmargin.units.Entry;
import org.gasmargin.worksheet.layout.Cell;
import org.gasmargin.worksheet.layout.Flow;
import org.gasmargin.worksheet.layout.Paragraph;
import org.gasmargin.worksheet.layout.Style;
import org.gasmargin.worksheet.layout.Table;

/** The inputs exactly as typed. */
final class InputsPart {
  private static final List<Table.Column> COLUMNS =
      List.of(
          Table.Column.text("Input"),
          Table.Column.text("As typed"),
          Table.Column.text("Read from"),
          Table.Column.numbers("Line:column"));

  private InputsPart() {}

  static void write(Flow flow, WorksheetContent content) {
    flow.section("Inputs as typed");
    Set<String> files = new LinkedHashSet<>();
    content.entries().forEach(entry -> files.add(entry.place().file()));
    flow.add(
        Paragraph.of(
                "From " + String.join(", ", files) + ". Each is to be compared with the equipment.",
                Style.SMALL)
            .keptWithNext());
    flow.gap(2);
    flow.add(new Table(COLUMNS, content.entries().stream().map(InputsPart::row).toList()));
  }

  private static Table.Row row(Entry entry) {
    return Table.Row.of(
        Cell.plainName(entry.path()),
        Cell.of(entry.typed()),
        Cell.of(entry.readFrom().orElse("not stated")),
        Cell.of(entry.place().line() + ":" + entry.place().column()));
  }
}
