package org.gasmargin.worksheet;

import java.util.List;
import java.util.Optional;
import org.gasmargin.rules.Finding;
import org.gasmargin.worksheet.handcheck.HandCheck;
import org.gasmargin.worksheet.handcheck.HandChecks;
import org.gasmargin.worksheet.handcheck.IdealisedChange;
import org.gasmargin.worksheet.handcheck.IdealisedChanges;
import org.gasmargin.worksheet.handcheck.Line;
import org.gasmargin.worksheet.layout.Barred;
import org.gasmargin.worksheet.layout.Block;
import org.gasmargin.worksheet.layout.Cell;
import org.gasmargin.worksheet.layout.Flow;
import org.gasmargin.worksheet.layout.Paragraph;
import org.gasmargin.worksheet.layout.Run;
import org.gasmargin.worksheet.layout.Style;
import org.gasmargin.worksheet.layout.Table;
import org.gasmargin.worksheet.numbers.Digits;

/** The governing number redone on a pocket calculator. */
final class HandCheckPart {
  private static final List<Table.Column> LINES =
      List.of(
          Table.Column.text("Symbol"),
          Table.Column.text("Formula"),
          Table.Column.text("Filled in"),
          Table.Column.numbers("Result"),
          Table.Column.text("Unit"));

  private static final List<Table.Column> CHANGES =
      List.of(
          Table.Column.text("Step"),
          Table.Column.text("Idealised change"),
          Table.Column.text("Work done by the gas"),
          Table.Column.numbers("W/kJ"),
          Table.Column.text("Heat taken in by the gas"),
          Table.Column.numbers("Q/kJ"));

  private final WorksheetContent content;
  private final Governing governing;

  HandCheckPart(WorksheetContent content, Governing governing) {
    this.content = content;
    this.governing = governing;
  }

  void write(Flow flow) {
    flow.section("Hand check with the ideal gas");
    List<Finding> ranked = governing.ranked();
    HandChecks checks = new HandChecks(content.result(), content.units());
    Optional<HandCheck> check = checks.first(ranked);
    if (check.isEmpty()) {
      flow.add(
          Paragraph.of(
              "No closed form leads to a number of this sheet: the numbers are set by the procedure"
                  + " or by the surroundings, or they were not computed.",
              Style.BODY));
    } else {
      if (checks.of(ranked.get(0)).isEmpty()) {
        flow.add(
            Paragraph.of(
                "No closed form leads to the governing number itself; the next finding that rests"
                    + " on one is redone instead.",
                Style.TABLE));
        flow.gap(2);
      }
      write(flow, check.get());
    }
    changes(flow);
  }

  private static void write(Flow flow, HandCheck check) {
    flow.add(Paragraph.of(new Run(Prose.sentence(check.what()), Style.STRONG)).keptWithNext());
    flow.add(
        Paragraph.of(
                check.title()
                    + ". Ideal gas of constant γ; each line goes on with the printed"
                    + " numbers.",
                Style.TABLE)
            .keptWithNext());
    flow.gap(3);
    flow.add(new Table(LINES, check.lines().stream().map(HandCheckPart::row).toList()));
    flow.gap(3);
    boolean outside = check.agreement().isPresent() && !check.agreement().get();
    Style style = outside ? Style.TABLE.strong() : Style.TABLE;
    flow.add(
        new Barred(
            check.comparison().stream().<Block>map(s -> Paragraph.of(s, style)).toList(),
            outside ? 4 : 2,
            outside ? 0 : 0.5f,
            1));
  }

  private static Table.Row row(Line line) {
    return Table.Row.of(
        Cell.name(line.symbol()),
        Cell.of(line.formula()),
        Cell.of(line.filledIn().isEmpty() ? "given" : line.filledIn()),
        Cell.of(new Run(line.result().toString(), Style.TABLE.strong())),
        Cell.of(line.unit()));
  }

  private void changes(Flow flow) {
    List<IdealisedChange> changes = IdealisedChanges.of(content.result());
    if (changes.isEmpty()) {
      return;
    }
    flow.gap(6);
    flow.add(
        Paragraph.of(
                "Work and heat of the classical changes that bound each step, ideal gas, from the"
                    + " start and end of the path without heat exchange. Negative: work done on the"
                    + " gas, heat given off by it.",
                Style.TABLE)
            .keptWithNext());
    flow.gap(2);
    flow.add(new Table(CHANGES, changes.stream().map(HandCheckPart::row).toList()));
  }

  private static Table.Row row(IdealisedChange change) {
    return Table.Row.of(
        Cell.of(change.step()),
        Cell.plainName(change.change()),
        Cell.of(change.work()),
        Cell.of(Digits.of(change.value().work() / 1e3)),
        Cell.of(change.heat()),
        Cell.of(Digits.of(change.value().heat() / 1e3)));
  }
}
