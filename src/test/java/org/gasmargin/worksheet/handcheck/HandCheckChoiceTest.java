package org.gasmargin.worksheet.handcheck;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.Severity;
import org.gasmargin.rules.Verdict;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Unit;
import org.junit.jupiter.api.Test;

class HandCheckChoiceTest {
  private static final DisplayUnits UNITS = DisplayUnits.of(Unit.BAR_GAUGE, 101_325);

  @Test
  void valueThatCountsOnTheWallIsHeldAgainstTheBoundWithoutHeat() {
    Situation.Case filled = Situation.CHARGE.compute("air");
    double credited = 330;
    HandCheck check =
        new HandChecks(filled.result(), UNITS).of(finding("1", credited)).orElseThrow();
    assertTrue(check.what().contains("behind which the predicted value"), check.what());
  }

  @Test
  void startOfAVentIsNoReasonToRedoItsColdEnd() {
    Situation.Case vented = Situation.VENT.compute("air");
    double warmest = vented.step().envelope().highestGasTemperature().orElseThrow().value();
    HandChecks checks = new HandChecks(vented.result(), UNITS);
    assertEquals(Optional.empty(), checks.of(finding("2", warmest)));
    assertEquals(Optional.empty(), checks.of(finding("2", warmest + 1)));
  }

  @Test
  void nextFindingIsRedoneWhereTheFirstHasNoClosedForm() {
    Situation.Case vented = Situation.VENT.compute("air");
    double warmest = vented.step().envelope().highestGasTemperature().orElseThrow().value();
    double coldest = vented.step().envelope().lowestGasTemperature().orElseThrow().value();
    Optional<HandCheck> check =
        new HandChecks(vented.result(), UNITS)
            .first(List.of(finding("2", warmest), finding("2", coldest)));
    assertTrue(check.orElseThrow().what().contains("lowest gas temperature"));
  }

  @Test
  void findingWithoutANumberHasNoHandCheck() {
    HandChecks checks = new HandChecks(Situation.CHARGE.compute("air").result(), UNITS);
    assertEquals(Optional.empty(), checks.of(finding("1", OptionalDouble.empty())));
    assertEquals(Optional.empty(), checks.of(finding("no such step", 330)));
  }

  private static Finding finding(String step, double predicted) {
    return finding(step, OptionalDouble.of(predicted));
  }

  private static Finding finding(String step, OptionalDouble predicted) {
    return new Finding(
        "test.rule",
        "Test",
        step,
        "v",
        Verdict.OVER_LIMIT,
        Severity.DAMAGE,
        "temperature",
        Dimension.TEMPERATURE,
        predicted,
        OptionalDouble.empty(),
        Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        "",
        "",
        "",
        "none",
        "test");
  }
}
