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

/** Findings as tables with margin bars. */
final class FindingsTable {
  private static final float BAR_WIDTH = 84;

  private final WorksheetContent content;
  private final Governing governing;

  FindingsTable(WorksheetContent content, Governing governing) {
    this.content = content;
    this.governing = governing;
  }

  /** A row for each set of numbers. */
  Table brief(List<FindingGroup> groups) {
    List<Table.Row> rows = new ArrayList<>();
    for (FindingGroup group : groups) {
      for (FindingGroup.Line line : group.lines()) {
        rows.add(row(line, Cell.name(name(line.finding())), false));
      }
    }
    return new Table(columns("Finding"), rows);
  }

  /** The rule, a row for each set of numbers with its path, then source and caution. */
  Table full(List<FindingGroup> groups) {
    List<Table.Row> rows = new ArrayList<>();
    List<Table.Column> columns = columns("Path or reason");
    for (FindingGroup group : groups) {
      rows.add(new Table.Row(List.of(title(group.first()).across(columns.size())), true));
      for (FindingGroup.Line line : group.lines()) {
        rows.add(row(line, Cell.of(pathOrReason(line.finding())), true));
      }
      rows.add(Table.Row.of(Cell.of(details(group.first())).across(columns.size())));
    }
    return new Table(columns, rows);
  }

  /** The quantity of a finding, with the vessel where there are several. */
  String name(Finding finding) {
    String what = finding.predicted().isPresent() ? finding.quantity() : finding.title();
    boolean alone = content.result().procedure().vessels().size() == 1;
    return Prose.tidy(alone ? what : finding.vessel() + ": " + what);
  }

  private static List<Table.Column> columns(String second) {
    return List.of(
        Table.Column.text("Step"),
        Table.Column.text(second),
        Table.Column.text("reference → limit").wide(BAR_WIDTH),
        Table.Column.numbers("Predicted"),
        Table.Column.numbers("Limit"),
        Table.Column.numbers("Margin"),
        Table.Column.numbers("Required"),
        Table.Column.text("Verdict"));
  }

  private Table.Row row(FindingGroup.Line line, Cell second, boolean keptWithNext) {
    Finding finding = line.finding();
    FindingNumbers numbers = new FindingNumbers(finding, content.units());
    boolean within = finding.verdict() == Verdict.WITHIN_LIMITS;
    Style style = within ? Style.TABLE : Style.TABLE.strong();
    return new Table.Row(
        List.of(
            Cell.of(line.stepWords()),
            second,
            Governing.hasBar(finding) ? Cell.of(bar(finding, numbers)) : Cell.of(""),
            Cell.of(numbers.predicted()),
            Cell.of(numbers.limit()),
            Cell.of(numbers.margin()),
            Cell.of(numbers.requiredMargin()),
            Cell.of(new Run(finding.verdict().words().replace(' ', '\u00a0'), style))),
        keptWithNext);
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

  private Cell title(Finding finding) {
    boolean alone = content.result().procedure().vessels().size() == 1;
    String vessel = alone ? "" : finding.vessel() + ": ";
    return Cell.of(
        new Run(Prose.tidy(vessel + finding.title()), Style.TABLE.strong()),
        new Run("  " + finding.rule(), Style.SMALL));
  }

  private static String pathOrReason(Finding finding) {
    boolean told = Governing.hasBar(finding) && !finding.path().isBlank();
    return told ? Prose.tidy(finding.path()) : Prose.sentence(finding.reason());
  }

  private static Run[] details(Finding finding) {
    List<Run> runs = new ArrayList<>();
    label(runs, "Predicted: ", finding.quantity());
    finding.limitOrigin().ifPresent(origin -> label(runs, " Limit read from: ", origin));
    label(runs, " Source: ", finding.source() + " (" + finding.sourceStatus() + ")");
    if (!finding.caution().isBlank()) {
      label(runs, " Caution: ", finding.caution());
    }
    return runs.toArray(new Run[0]);
  }

  private static void label(List<Run> runs, String label, String text) {
    runs.add(new Run(label, Style.SMALL.strong()));
    String tidy = Prose.tidy(text);
    runs.add(new Run(tidy.endsWith(".") ? tidy : tidy + ".", Style.SMALL));
  }
}
