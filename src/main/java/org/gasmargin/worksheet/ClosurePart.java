package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import org.gasmargin.process.Closure;
import org.gasmargin.process.StepResult;
import org.gasmargin.worksheet.layout.Cell;
import org.gasmargin.worksheet.layout.Flow;
import org.gasmargin.worksheet.layout.Table;
import org.gasmargin.worksheet.numbers.Digits;

/** What is left over in the balances of mass and energy. */
final class ClosurePart {
  private ClosurePart() {}

  static void write(Flow flow, WorksheetContent content) {
    flow.section("Closure of mass and energy");
    flow.add(closures(content));
  }

  private static Table closures(WorksheetContent content) {
    List<Table.Row> rows = new ArrayList<>();
    for (StepResult result : content.result().steps()) {
      rows.add(
          result
              .closure()
              .map(
                  closure ->
                      Table.Row.of(
                          Cell.name("Step " + result.step().id()),
                          Cell.of(Digits.power(closure.massRelative())),
                          Cell.of(Digits.power(closure.energyRelative())),
                          Cell.of(Digits.power(Closure.BOUND)),
                          Cell.of(closure.holds() ? "holds" : "DOES NOT HOLD: not assessed")))
              .orElseGet(
                  () ->
                      Table.Row.of(
                          Cell.name("Step " + result.step().id()),
                          Cell.of("no balance: nothing could be computed").across(4))));
    }
    return new Table(
        List.of(
            Table.Column.text("Step"),
            Table.Column.numbers("Mass left over, relative"),
            Table.Column.numbers("Energy left over, relative"),
            Table.Column.numbers("Bound"),
            Table.Column.text("Result")),
        rows);
  }
}
