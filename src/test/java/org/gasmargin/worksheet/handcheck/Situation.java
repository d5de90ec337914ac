package org.gasmargin.worksheet.handcheck;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Envelope;
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
import org.gasmargin.rules.Severity;
import org.gasmargin.rules.Verdict;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.Vessel;

/** Procedures with one number each that a closed form can redo. */
enum Situation {
  CHARGE(Dimension.TEMPERATURE, "highest mean gas temperature"),
  MASS_CHARGE(Dimension.ABSOLUTE_PRESSURE, "highest pressure"),
  VENT(Dimension.TEMPERATURE, "lowest mean gas temperature"),
  COMPRESSION(Dimension.TEMPERATURE, "temperature of the trapped gas"),
  ISOCHORE(Dimension.ABSOLUTE_PRESSURE, "highest pressure"),
  DEVELOPED(
      Dimension.ABSOLUTE_PRESSURE, "pressure at 65 degC of the most gas that can be in the vessel"),
  SETTLED(
      Dimension.ABSOLUTE_PRESSURE,
      "pressure at 15 degC of the least gas that can be in the vessel");

  static final double ATMOSPHERE = 101_325;

  private static final Interval AMBIENT = Interval.around(293.15, 5);
  private static final Supply BANK = new Supply("bank", Interval.exactly(250e5), AMBIENT);

  private final Dimension dimension;
  private final String quantity;

  Situation(Dimension dimension, String quantity) {
    this.dimension = dimension;
    this.quantity = quantity;
  }

  /** The hand check of the situation's number for a gas, if a closed form leads there. */
  Optional<HandCheck> check(String gasName, DisplayUnits units) {
    Case done = compute(gasName);
    return new HandChecks(done.result(), units).of(finding(done));
  }

  /**
   * A computed situation.
   *
   * @param result the procedure with the step that sets the number
   */
  record Case(ProcedureResult result) {
    StepResult step() {
      return result.steps().get(0);
    }

    Gas gas() {
      return result.procedure().vessels().get(0).gas();
    }
  }

  /** Computes the bounds of the situation. */
  Case compute(String gasName) {
    Gas gas = new GasCatalogue().find(gasName).orElseThrow();
    Vessel vessel =
        new Vessel(
            "v",
            gas,
            Interval.around(0.05, 0.0005),
            Interval.exactly(11e5),
            Interval.exactly(293.15),
            Interval.exactly(293.15),
            Optional.empty());
    Site site = new Site(AMBIENT, Interval.exactly(ATMOSPHERE));
    BoundTrack track = new BoundTrack(vessel, site);
    List<Step> steps = steps(gas);
    Step step = steps.get(steps.size() - 1);
    if (steps.size() > 1) {
      track.advance(steps.get(0), track.surroundings());
    }
    BoundStep bounds = track.advance(step, track.surroundings());
    StepResult result =
        new StepResult(
            step,
            bounds.paths(),
            bounds.envelope(),
            Optional.empty(),
            bounds.closure(),
            bounds.amount(),
            List.of(),
            List.of(),
            Optional.empty());
    Procedure procedure = new Procedure(site, List.of(vessel), List.of(step));
    return new Case(new ProcedureResult(procedure, List.of(result)));
  }

  private List<Step> steps(Gas gas) {
    Step fill = fill(new Drive.PressureRamp(Interval.exactly(180e5), 60));
    Interval vented = Interval.exactly(60e5);
    return switch (this) {
      case CHARGE, DEVELOPED, SETTLED -> List.of(fill);
      case MASS_CHARGE ->
          List.of(fill(new Drive.MassFlow(Interval.around(4.5 * gas.molarMass(), 1e-5), 40)));
      case VENT -> List.of(fill, new Step.Vent("2", "v", new Drive.PressureRamp(vented, 9)));
      case COMPRESSION -> List.of(new Step.Compress("2", "v", Interval.exactly(200e5), 0.1));
      case ISOCHORE -> List.of(fill, new Step.Hold("2", "v", 600));
    };
  }

  private static Step fill(Drive drive) {
    return new Step.Fill("1", "v", BANK, drive, OptionalDouble.empty());
  }

  private double predicted(Case done) {
    Gas gas = done.gas();
    Envelope envelope = done.step().envelope();
    Optional<Extreme> extreme =
        switch (this) {
          case CHARGE -> envelope.highestGasTemperature();
          case VENT -> envelope.lowestGasTemperature();
          case COMPRESSION -> envelope.highestUnmixedTemperature();
          default -> envelope.highestPressure();
        };
    StepResult.DensityRange amount = done.step().settledAmount().orElseThrow();
    return switch (this) {
      case DEVELOPED -> gas.at(338.15, amount.most()).pressure();
      case SETTLED -> gas.at(288.15, amount.least()).pressure();
      default -> extreme.orElseThrow().value();
    };
  }

  private Finding finding(Case done) {
    return new Finding(
        "test.rule",
        "Test",
        done.step().step().id(),
        "v",
        Verdict.OVER_LIMIT,
        Severity.DAMAGE,
        quantity,
        dimension,
        OptionalDouble.of(predicted(done)),
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
