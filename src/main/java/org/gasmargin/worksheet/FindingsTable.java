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
  private static final float BAR_WIDTH = 79;
  private static final float WIDE_BAR_WIDTH = 150;

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
        rows.add(row(line, List.of(Cell.name(name(line.finding()))), false));
      }
    }
    return new Table(columns(List.of(Table.Column.text("Finding")), BAR_WIDTH), rows);
  }

  /** The rule, a row for each set of numbers, then their paths, source and caution. */
  Table full(List<FindingGroup> groups) {
    List<Table.Row> rows = new ArrayList<>();
    List<Table.Column> columns = columns(List.of(), WIDE_BAR_WIDTH);
    for (FindingGroup group : groups) {
      rows.add(new Table.Row(List.of(title(group.first()).across(columns.size())), true));
      for (FindingGroup.Line line : group.lines()) {
        rows.add(row(line, List.of(), true));
      }
      rows.add(Table.Row.of(Cell.of(details(group)).across(columns.size())));
    }
    return new Table(columns, rows);
  }

  /** The quantity of a finding, with the vessel where there are several. */
  String name(Finding finding) {
    String what = finding.predicted().isPresent() ? finding.quantity() : finding.title();
    boolean alone = content.result().procedure().vessels().size() == 1;
    return Prose.tidy(alone ? what : finding.vessel() + ": " + what);
  }

  private static List<Table.Column> columns(List<Table.Column> named, float barWidth) {
    List<Table.Column> columns = new ArrayList<>();
    columns.add(Table.Column.text("Step"));
    columns.addAll(named);
    columns.add(Table.Column.text("reference → limit").wide(barWidth));
    columns.add(Table.Column.numbers("Predicted"));
    columns.add(Table.Column.numbers("Limit"));
    columns.add(Table.Column.text("Unit"));
    columns.add(Table.Column.numbers("Margin"));
    columns.add(Table.Column.numbers("Required"));
    columns.add(Table.Column.text("Unit"));
    columns.add(Table.Column.text("Verdict"));
    return columns;
  }

  private Table.Row row(FindingGroup.Line line, List<Cell> named, boolean keptWithNext) {
    Finding finding = line.finding();
    FindingNumbers numbers = new FindingNumbers(finding, content.units());
    boolean within = finding.verdict() == Verdict.WITHIN_LIMITS;
    Style style = within ? Style.TABLE : Style.TABLE.strong();
    List<Cell> cells = new ArrayList<>();
    cells.add(Cell.of(line.stepWords()));
    cells.addAll(named);
    cells.add(Governing.hasBar(finding) ? Cell.of(bar(finding, numbers)) : Cell.of(""));
    cells.add(Cell.of(numbers.predicted()));
    cells.add(Cell.of(numbers.limit()));
    cells.add(Cell.of(numbers.unit()));
    cells.add(Cell.of(numbers.margin()));
    cells.add(Cell.of(numbers.requiredMargin()));
    cells.add(Cell.of(numbers.differenceUnit()));
    cells.add(Cell.of(new Run(finding.verdict().words().replace(' ', '\u00a0'), style)));
    return new Table.Row(cells, keptWithNext);
  }

  private Figure bar(Finding finding, FindingNumbers numbers) {
    String alternative =
        "Bar: predicted "
            + numbers.predicted()
            + " against limit "
            + numbers.limit()
            + " "
            + numbers.unit()
            + ", margin "
            + numbers.margin()
            + ", required "
            + numbers.requiredMargin()
            + " "
            + numbers.differenceUnit();
    return new Figure(MarginBar.HEIGHT, alternative, governing.bar(finding));
  }

  private Cell title(Finding finding) {
    boolean alone = content.result().procedure().vessels().size() == 1;
    String vessel = alone ? "" : finding.vessel() + ": ";
    return Cell.of(
        new Run(Prose.tidy(vessel + finding.title()), Style.TABLE.strong()),
        new Run("  " + finding.rule() + ", " + finding.severity().key(), Style.SMALL));
  }

  private Run[] details(FindingGroup group) {
    Finding finding = group.first();
    List<Run> runs = new ArrayList<>();
    label(runs, "Predicted: ", finding.quantity());
    for (FindingGroup.Line line : group.lines()) {
      String path = pathOrReason(line.finding());
      label(runs, " Step " + line.stepWords() + ": ", path);
    }
    finding.limitOrigin().ifPresent(origin -> label(runs, " Limit read from: ", origin));
    label(runs, " Source: ", finding.source() + " (" + finding.sourceStatus() + ")");
    String caution = Cautions.ownOf(group, content.judgement().findings());
    if (!caution.isBlank()) {
      label(runs, " Caution: ", caution);
    }
    return runs.toArray(new Run[0]);
  }

  private static String pathOrReason(Finding finding) {
    boolean told = Governing.hasBar(finding) && !finding.path().isBlank();
    return told ? finding.path() : finding.reason();
  }

  private static void label(List<Run> runs, String label, String text) {
    runs.add(new Run(label, Style.SMALL.strong()));
    String tidy = Prose.tidy(text);
    runs.add(new Run(tidy.endsWith(".") ? tidy : tidy + ".", Style.SMALL));
  }
}
