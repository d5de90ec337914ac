package org.gasmargin.worksheet;

import java.util.List;
import org.gasmargin.rules.Finding;
import org.gasmargin.worksheet.layout.Cell;
import org.gasmargin.worksheet.layout.Flow;
import org.gasmargin.worksheet.layout.Table;

/** Boxes for the people who answer for the sheet, under the cautions once more. */
final class SignaturePart {
  private SignaturePart() {}

  static void write(Flow flow, WorksheetContent content, List<Finding> deciding) {
    flow.section("Signatures");
    flow.add(CautionBox.of(deciding));
    flow.gap(6);
    flow.add(
        new Table(
            List.of(
                Table.Column.text("Role").wide(110),
                Table.Column.text("Name"),
                Table.Column.text("Date").wide(90),
                Table.Column.text("Signature").wide(150)),
            List.of(
                row("Preparation", content.preparedBy()),
                row("Independent check", ""),
                row("Approval", ""))));
  }

  private static Table.Row row(String role, String name) {
    return Table.Row.of(Cell.name(role + "\n\n"), Cell.of(name), Cell.of(""), Cell.of(""));
  }
}
