package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.Verdict;
import org.gasmargin.worksheet.layout.Cell;
import org.gasmargin.worksheet.layout.Figure;
import org.gasmargin.worksheet.layout.Run;
import org.gasmargin.worksheet.layout.Style;
import org.gasmargin.worksheet.layout.Table;
import org.gasmargin.worksheet.plot.MarginBar;

/** Findings as a table with margin bars. */
final class FindingsTable {
  private static final List<Table.Column> COLUMNS =
      List.of(
          Table.Column.text("Step"),
          Table.Column.text("Finding"),
          Table.Column.text("reference → limit").wide(92),
          Table.Column.numbers("Predicted"),
          Table.Column.numbers("Limit"),
          Table.Column.numbers("Margin"),
          Table.Column.numbers("Required"),
          Table.Column.text("Verdict"));

  private final WorksheetContent content;
  private final Governing governing;

  FindingsTable(WorksheetContent content, Governing governing) {
    this.content = content;
    this.governing = governing;
  }

  /** A row a finding. */
  Table brief(List<Finding> findings) {
    return new Table(COLUMNS, findings.stream().map(f -> new Table.Row(cells(f), false)).toList());
  }

  /** A row of numbers a finding, and a row of words below it. */
  Table full(List<Finding> findings) {
    List<Table.Row> rows = new ArrayList<>();
    for (Finding finding : findings) {
      rows.add(new Table.Row(cells(finding), true));
      rows.add(Table.Row.of(Cell.of(details(finding)).across(COLUMNS.size())));
    }
    return new Table(COLUMNS, rows);
  }

  private List<Cell> cells(Finding finding) {
    FindingNumbers numbers = new FindingNumbers(finding, content.units());
    return List.of(
        Cell.of(finding.step()),
        Cell.name(finding.vessel() + ": " + Prose.tidy(finding.title())),
        Governing.hasBar(finding) ? Cell.of(bar(finding, numbers)) : Cell.of(""),
        Cell.of(numbers.predicted()),
        Cell.of(numbers.limit()),
        Cell.of(numbers.margin()),
        Cell.of(numbers.requiredMargin()),
        Cell.of(
            new Run(
                finding.verdict().words(),
                finding.verdict() == Verdict.WITHIN_LIMITS ? Style.TABLE : Style.TABLE.strong())));
  }

  private Figure bar(Finding finding, FindingNumbers numbers) {
    String alternative =
        "Bar: predicted "
            + numbers.predicted()
            + " against limit "
            + numbers.limit()
            + ", margin "
            + numbers.margin()
            + ", required "
            + numbers.requiredMargin();
    return new Figure(MarginBar.HEIGHT, alternative, governing.bar(finding));
  }

  private static Run[] details(Finding finding) {
    List<Run> runs = new ArrayList<>();
    runs.add(new Run(Prose.sentence(finding.reason()), Style.SMALL.inGray(0)));
    label(runs, " Predicted: ", finding.quantity());
    if (!finding.path().isBlank()) {
      label(runs, " Path: ", finding.path());
    }
    finding.limitOrigin().ifPresent(origin -> label(runs, " Limit read from: ", origin));
    label(runs, " Source: ", finding.source() + " (" + finding.sourceStatus() + ")");
    label(runs, " Rule: ", finding.rule());
    if (!finding.caution().isBlank()) {
      label(runs, "\nCaution: ", finding.caution());
    }
    return runs.toArray(new Run[0]);
  }

  private static void label(List<Run> runs, String label, String text) {
    runs.add(new Run(label, Style.SMALL.strong()));
    String tidy = Prose.tidy(text);
    runs.add(new Run(tidy.endsWith(".") ? tidy : tidy + ".", Style.SMALL));
  }
}
