package org.gasmargin.rules;

import static org.gasmargin.rules.ResultQuantity.DURATION;
import static org.gasmargin.rules.ResultQuantity.LOWEST_GAS_TEMPERATURE;
import static org.gasmargin.rules.ResultQuantity.LOWEST_METAL_TEMPERATURE;
import static org.gasmargin.rules.ResultQuantity.LOWEST_PRESSURE;
import static org.gasmargin.rules.ResultQuantity.PEAK_GAS_TEMPERATURE;
import static org.gasmargin.rules.ResultQuantity.PEAK_METAL_TEMPERATURE;
import static org.gasmargin.rules.ResultQuantity.PEAK_PRESSURE;
import static org.gasmargin.rules.ResultQuantity.UNMIXED_TEMPERATURE;

import java.util.List;
import java.util.Optional;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;

/** The quantities of a step on its bounds, without credit for heat taken by the wall. */
final class EnvelopeValues {
  private static final String SURROUNDINGS = "the wall or its surroundings, further than the gas";

  private final Envelope envelope;
  private final StepValues values;

  private EnvelopeValues(Envelope envelope, StepValues values) {
    this.envelope = envelope;
    this.values = values;
  }

  /** Adds every quantity of the envelope. */
  static void add(StepResult result, StepValues values) {
    EnvelopeValues reader = new EnvelopeValues(result.envelope(), values);
    reader.addExtremes();
    reader.addMetal();
    addShortestDuration(result, values);
    values.putPressureRate();
  }

  /** Adds the highest temperature of gas that is pushed ahead without mixing. */
  static void addUnmixed(StepResult result, StepValues values) {
    new EnvelopeValues(result.envelope(), values)
        .add(UNMIXED_TEMPERATURE, result.envelope().highestUnmixedTemperature());
  }

  private void addExtremes() {
    add(PEAK_GAS_TEMPERATURE, envelope.highestGasTemperature());
    add(LOWEST_GAS_TEMPERATURE, envelope.lowestGasTemperature());
    add(PEAK_PRESSURE, envelope.highestPressure());
    add(LOWEST_PRESSURE, envelope.lowestPressure());
  }

  private void add(ResultQuantity quantity, Optional<Extreme> extreme) {
    if (extreme.isPresent()) {
      values.put(quantity, extreme.get().value(), extreme.get().path());
    } else {
      values.unknown(
          quantity,
          envelope.failures().isEmpty()
              ? "it was not computed for this step"
              : String.join("; ", envelope.failures()));
    }
  }

  /** Metal can get as far as the gas or its surroundings, whichever is further. */
  private void addMetal() {
    double highest = envelope.highestSurroundings();
    double lowest = envelope.lowestSurroundings();
    Operand hot = values.get(PEAK_GAS_TEMPERATURE);
    Operand cold = values.get(LOWEST_GAS_TEMPERATURE);
    boolean gasIsHotter = !(hot instanceof Operand.Figure gas && gas.si() < highest);
    boolean gasIsColder = !(cold instanceof Operand.Figure gas && gas.si() > lowest);
    addMetal(PEAK_METAL_TEMPERATURE, hot, highest, gasIsHotter);
    addMetal(LOWEST_METAL_TEMPERATURE, cold, lowest, gasIsColder);
  }

  private void addMetal(
      ResultQuantity quantity, Operand gas, double surroundings, boolean gasIsFurther) {
    if (gasIsFurther && Double.isFinite(surroundings)) {
      values.put(quantity, gas);
    } else {
      values.put(quantity, surroundings, SURROUNDINGS);
    }
  }

  /** The shortest duration over the paths that the gas as a whole can take. */
  private static void addShortestDuration(StepResult result, StepValues values) {
    List<PathKind> kinds =
        result.step() instanceof Step.Compress
            ? List.of(PathKind.UNMIXED)
            : List.of(PathKind.ISOTHERMAL, PathKind.ADIABATIC, PathKind.MODELLED);
    double shortest = Double.POSITIVE_INFINITY;
    for (PathKind kind : kinds) {
      if (result.paths().get(kind) instanceof PathOutcome.Failed failed) {
        values.unknown(DURATION, failed.reason());
        return;
      }
      Optional<Path> path = result.path(kind);
      if (path.isPresent()) {
        shortest = Math.min(shortest, path.get().duration());
      }
    }
    values.put(DURATION, shortest, "");
  }
}
