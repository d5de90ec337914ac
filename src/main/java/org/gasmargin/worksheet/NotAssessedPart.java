package org.gasmargin.worksheet;

import java.util.List;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.Verdict;
import org.gasmargin.worksheet.layout.Cell;
import org.gasmargin.worksheet.layout.Flow;
import org.gasmargin.worksheet.layout.Paragraph;
import org.gasmargin.worksheet.layout.Style;
import org.gasmargin.worksheet.layout.Table;

/** What could not be judged, set apart so that it cannot pass for a result. */
final class NotAssessedPart {
  private NotAssessedPart() {}

  static void write(Flow flow, WorksheetContent content) {
    List<Finding> open =
        content.judgement().findings().stream()
            .filter(finding -> finding.verdict() == Verdict.NOT_ASSESSED)
            .toList();
    flow.section("Not assessed");
    if (open.isEmpty()) {
      flow.add(
          Paragraph.of(
              "Every rule that applies could be evaluated. What no rule asks for was not looked"
                  + " at.",
              Style.BODY));
      return;
    }
    flow.add(
        Paragraph.of(
                "These items are open. None of them is within limits until somebody shows that it"
                    + " is.",
                Style.STRONG)
            .keptWithNext());
    flow.gap(3);
    flow.add(
        new Table(
            List.of(
                Table.Column.text("Step"),
                Table.Column.text("Item"),
                Table.Column.text("Why, and what to look up"),
                Table.Column.text("Source and status")),
            open.stream().map(NotAssessedPart::row).toList()));
  }

  private static Table.Row row(Finding finding) {
    return Table.Row.of(
        Cell.of(finding.step()),
        Cell.name(finding.vessel() + ": " + Prose.tidy(finding.title())),
        Cell.of(Prose.sentence(finding.reason())),
        Cell.of(Prose.tidy(finding.source()) + " (" + finding.sourceStatus() + ")"));
  }
}
