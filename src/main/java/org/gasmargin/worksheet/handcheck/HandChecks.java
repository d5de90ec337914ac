package org.gasmargin.worksheet.handcheck;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.process.Stretch;
import org.gasmargin.rules.Finding;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.Vessel;

/** Finds the closed form that redoes a number. */
public final class HandChecks {
  private static final double SAME = 1e-9;
  private static final double UNMOVED = 1e-6;

  private final ProcedureResult result;
  private final DisplayUnits units;

  /** Hand checks of the numbers of a procedure, in the user's units. */
  public HandChecks(ProcedureResult result, DisplayUnits units) {
    this.result = result;
    this.units = units;
  }

  /**
   * The hand check of the first finding whose number rests on a closed form.
   *
   * @param ranked findings, the governing one first
   */
  public Optional<HandCheck> first(List<Finding> ranked) {
    for (Finding finding : ranked) {
      Optional<HandCheck> check = of(finding);
      if (check.isPresent()) {
        return check;
      }
    }
    return Optional.empty();
  }

  /** The hand check of one finding; empty if no closed form leads to its number. */
  public Optional<HandCheck> of(Finding finding) {
    if (finding.predicted().isEmpty()) {
      return Optional.empty();
    }
    double predicted = finding.predicted().getAsDouble();
    return result.steps().stream()
        .filter(step -> step.step().id().equals(finding.step()))
        .findFirst()
        .flatMap(step -> of(finding, step, predicted));
  }

  private Optional<HandCheck> of(Finding finding, StepResult step, double predicted) {
    Envelope envelope = step.envelope();
    return switch (finding.dimension()) {
      case TEMPERATURE ->
          check(step, envelope.highestUnmixedTemperature(), predicted, Sought.UNMIXED)
              .or(() -> check(step, envelope.highestGasTemperature(), predicted, Sought.HOTTEST))
              .or(() -> check(step, envelope.lowestGasTemperature(), predicted, Sought.COLDEST))
              .or(() -> adiabaticPath(step, finding, predicted));
      case ABSOLUTE_PRESSURE ->
          check(step, envelope.highestPressure(), predicted, Sought.HIGHEST_PRESSURE)
              .or(() -> check(step, envelope.lowestPressure(), predicted, Sought.LOWEST_PRESSURE))
              .or(() -> contentPressure(step, finding, predicted));
      default -> Optional.empty();
    };
  }

  private enum Sought {
    HOTTEST("highest gas temperature", true),
    COLDEST("lowest gas temperature", false),
    UNMIXED("temperature of gas pushed ahead without mixing", true),
    HIGHEST_PRESSURE("highest pressure", true),
    LOWEST_PRESSURE("lowest pressure", false);

    private final String words;
    private final boolean highest;

    Sought(String words, boolean highest) {
      this.words = words;
      this.highest = highest;
    }

    boolean isPressure() {
      return this == HIGHEST_PRESSURE || this == LOWEST_PRESSURE;
    }
  }

  private Optional<HandCheck> check(
      StepResult step, Optional<Extreme> extreme, double predicted, Sought sought) {
    if (!is(extreme, predicted)) {
      return Optional.empty();
    }
    String what = "Step " + step.step().id() + ", " + sought.words + ": " + extreme.get().path();
    return extreme.get().stretch().flatMap(s -> check(step, s, predicted, sought, what));
  }

  private static boolean is(Optional<Extreme> extreme, double predicted) {
    return extreme.isPresent() && Math.abs(extreme.get().value() / predicted - 1) <= SAME;
  }

  /**
   * The path without heat exchange from the nominal start, where no closed form leads to the number
   * itself: a bound that a value which counts on the wall must not pass, or the nearest path to an
   * extreme on the way to which the surroundings give or take heat.
   */
  private Optional<HandCheck> adiabaticPath(StepResult step, Finding finding, double predicted) {
    Envelope envelope = step.envelope();
    boolean isBound =
        Stream.of(
                envelope.highestGasTemperature(),
                envelope.lowestGasTemperature(),
                envelope.highestUnmixedTemperature())
            .anyMatch(extreme -> is(extreme, predicted));
    Optional<Path> path = step.path(PathKind.ADIABATIC);
    if (path.isEmpty()) {
      return Optional.empty();
    }
    PathPoint first = path.get().first();
    PathPoint last = path.get().last();
    double towards = last.temperature() - first.temperature();
    if (!((predicted - first.temperature()) * towards > 0)) {
      return Optional.empty();
    }
    Stretch stretch =
        new Stretch(
            first.pressure(), first.temperature(), last.pressure(), last.temperature(), false);
    Sought sought = towards > 0 ? Sought.HOTTEST : Sought.COLDEST;
    String what =
        "Step "
            + step.step().id()
            + (isBound
                ? ", path without heat exchange; heat passes on the way to the predicted value ("
                    + finding.quantity()
                    + "), so no closed form leads to it"
                : ", bound without heat exchange, behind which the predicted value ("
                    + finding.quantity()
                    + ") must stay");
    return check(step, stretch, last.temperature(), sought, what);
  }

  /** The pressure that the content takes on at a temperature, from the end of a fill. */
  private Optional<HandCheck> contentPressure(StepResult step, Finding finding, double predicted) {
    return FilledContent.of(finding.quantity(), step, vessel(step.step()).gas())
        .flatMap(
            content -> {
              Stretch stretch =
                  new Stretch(
                      content.pressure(),
                      content.temperature(),
                      predicted,
                      content.settled(),
                      true);
              Sought sought = content.most() ? Sought.HIGHEST_PRESSURE : Sought.LOWEST_PRESSURE;
              String what = "Step " + step.step().id() + ", " + finding.quantity();
              return check(step, stretch, predicted, sought, what);
            });
  }

  private Optional<HandCheck> check(
      StepResult step, Stretch stretch, double real, Sought sought, String what) {
    return calculation(step.step(), stretch, sought)
        .map(
            calculation -> {
              UnitFrame frame = UnitFrame.of(stretch, units);
              Comparison comparison =
                  new Comparison(
                      calculation, real, sought.highest, frame, Bands.find(calculation.band()));
              return new HandCheck(
                  what,
                  calculation.title(),
                  calculation.lines(),
                  comparison.sentences(),
                  comparison.agreement());
            });
  }

  private Optional<Calculation> calculation(Step step, Stretch stretch, Sought sought) {
    ClosedForm form = new ClosedForm(vessel(step).gas(), stretch, units);
    if (stretch.settling()) {
      return sought.isPressure() ? Optional.of(form.isochore()) : Optional.empty();
    }
    if (sought == Sought.HIGHEST_PRESSURE
        && step instanceof Step.Fill fill
        && fill.drive() instanceof Drive.MassFlow flow) {
      return Optional.of(new MassCharge(vessel(step), stretch, units).highestPressure(fill, flow));
    }
    boolean still = Math.abs(stretch.endPressure() / stretch.startPressure() - 1) < UNMOVED;
    if (still || sought.isPressure()) {
      return Optional.empty();
    }
    if (sought == Sought.UNMIXED || step instanceof Step.Compress) {
      return Optional.of(form.compression());
    }
    if (step instanceof Step.Fill fill) {
      Interval supply = fill.supply().temperature();
      double temperature = sought.highest ? supply.high() : supply.low();
      return Optional.of(form.charge(temperature, fill.supply().pressure().nominal()));
    }
    return step instanceof Step.Vent ? Optional.of(form.vent()) : Optional.empty();
  }

  private Vessel vessel(Step step) {
    return result.procedure().vesselOf(step);
  }
}
