package org.gasmargin.worksheet.handcheck;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.process.Supply;
import org.gasmargin.process.bounds.BoundStep;
import org.gasmargin.process.bounds.BoundTrack;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.Verdict;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Interval;
import org.gasmargin.units.Unit;
import org.gasmargin.vessel.Vessel;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Hand checks of real gases. Which way the formula leans: computed by an independent implementation
 * of published equations of state.
 */
class HandChecksTest {
  private static final double ATMOSPHERE = 101_325;
  private static final Interval AMBIENT = Interval.around(293.15, 5);

  @ParameterizedTest
  @ValueSource(strings = {"bar(g) degC", "psi(g) degF", "MPa(a) K", "Pa(a) degC"})
  void calculatorReproducesEveryLine(String units) {
    for (String gas : List.of("air", "helium", "hydrogen")) {
      for (HandCheck check : checks(gas, units(units))) {
        int computed = 0;
        for (Line line : check.lines()) {
          if (!line.filledIn().isEmpty()) {
            double half = 0.5000001 * Math.pow(10, -line.result().decimals());
            double value = Calculator.value(line.filledIn());
            double printed = Calculator.value(line.result().toString());
            assertEquals(value, printed, half, check.title() + ": " + line);
            computed++;
          }
        }
        assertTrue(computed >= 1, check.title());
      }
    }
  }

  @ParameterizedTest
  @CsvSource({
    "air, charge, conservative",
    "nitrogen, charge, conservative",
    "helium, charge, UNSAFE",
    "hydrogen, charge, UNSAFE",
    "air, vent, UNSAFE",
    "nitrogen, vent, UNSAFE",
    "oxygen, compression, conservative",
    "air, isochore, UNSAFE",
    "argon, isochore, UNSAFE"
  })
  void formulaLeansAsPublishedEquationsSay(String gas, String process, String side) {
    HandCheck check = check(gas, process, units("bar(g) degC"));
    String lean = check.comparison().get(1);
    assertTrue(lean.contains("which is the " + side + " side"), lean);
  }

  @ParameterizedTest
  @ValueSource(strings = {"nitrogen", "oxygen", "argon", "air", "helium", "hydrogen", "methane"})
  void realGasLiesInItsBand(String gas) {
    for (HandCheck check : checks(gas, units("bar(g) degC"))) {
      assertEquals(Optional.of(true), check.agreement(), check.title() + check.comparison().get(2));
    }
  }

  private static List<HandCheck> checks(String gas, DisplayUnits units) {
    return List.of(
        check(gas, "charge", units),
        check(gas, "vent", units),
        check(gas, "compression", units),
        check(gas, "isochore", units));
  }

  /** Fill, hold and vent; the finding is made for the extreme that the process sets. */
  private static HandCheck check(String gasName, String process, DisplayUnits units) {
    Gas gas = new GasCatalogue().find(gasName).orElseThrow();
    Vessel vessel =
        new Vessel(
            "v",
            gas,
            Interval.exactly(0.05),
            Interval.exactly(11e5),
            Interval.exactly(293.15),
            Interval.exactly(293.15),
            Optional.empty());
    Step fill =
        new Step.Fill(
            "1",
            "v",
            new Supply("bank", Interval.exactly(250e5), AMBIENT),
            new Drive.PressureRamp(Interval.exactly(180e5), 60),
            OptionalDouble.empty());
    Site site = new Site(AMBIENT, Interval.exactly(ATMOSPHERE));
    Step last =
        switch (process) {
          case "vent" -> new Step.Vent("2", "v", new Drive.PressureRamp(Interval.exactly(60e5), 9));
          case "compression" -> new Step.Compress("2", "v", Interval.exactly(200e5), 0.1);
          default -> new Step.Hold("2", "v", 600);
        };
    BoundTrack track = new BoundTrack(vessel, site);
    List<Step> steps =
        switch (process) {
          case "charge" -> List.of(fill);
          case "compression" -> List.of(last);
          default -> List.of(fill, last);
        };
    Step step = steps.get(steps.size() - 1);
    if (steps.size() > 1) {
      track.advance(fill, track.surroundings());
    }
    BoundStep done = track.advance(step, track.surroundings());
    Optional<Extreme> extreme =
        switch (process) {
          case "vent" -> done.envelope().lowestGasTemperature();
          case "isochore" -> done.envelope().highestPressure();
          case "compression" -> done.envelope().highestUnmixedTemperature();
          default -> done.envelope().highestGasTemperature();
        };
    Dimension dimension =
        process.equals("isochore") ? Dimension.ABSOLUTE_PRESSURE : Dimension.TEMPERATURE;
    ProcedureResult result =
        new ProcedureResult(
            new Procedure(site, List.of(vessel), List.of(step)), List.of(stepResult(step, done)));
    return new HandChecks(result, units)
        .of(finding(step, dimension, extreme.orElseThrow().value()))
        .orElseThrow();
  }

  private static StepResult stepResult(Step step, BoundStep bounds) {
    return new StepResult(
        step,
        bounds.paths(),
        bounds.envelope(),
        Optional.empty(),
        bounds.closure(),
        bounds.amount(),
        List.of(),
        List.of(),
        Optional.empty());
  }

  private static Finding finding(Step step, Dimension dimension, double predicted) {
    return new Finding(
        "test.rule",
        "Test",
        step.id(),
        "v",
        Verdict.OVER_LIMIT,
        "predicted",
        dimension,
        OptionalDouble.of(predicted),
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

  private static DisplayUnits units(String names) {
    String[] parts = names.split(" ", -1);
    Unit pressure = Unit.find(parts[0], Dimension.ABSOLUTE_PRESSURE).orElseThrow();
    Unit temperature = Unit.find(parts[1], Dimension.TEMPERATURE).orElseThrow();
    return new DisplayUnits(
        Map.of(Dimension.ABSOLUTE_PRESSURE, pressure, Dimension.TEMPERATURE, temperature),
        ATMOSPHERE);
  }
}
