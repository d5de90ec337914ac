package org.gasmargin.rules;

import static org.gasmargin.rules.ResultQuantity.DURATION;
import static org.gasmargin.rules.ResultQuantity.LOWEST_GAS_TEMPERATURE;
import static org.gasmargin.rules.ResultQuantity.LOWEST_METAL_TEMPERATURE;
import static org.gasmargin.rules.ResultQuantity.LOWEST_PRESSURE;
import static org.gasmargin.rules.ResultQuantity.MEAN_PRESSURE_RATE;
import static org.gasmargin.rules.ResultQuantity.PEAK_GAS_TEMPERATURE;
import static org.gasmargin.rules.ResultQuantity.PEAK_METAL_TEMPERATURE;
import static org.gasmargin.rules.ResultQuantity.PEAK_PRESSURE;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.StepResult;
import org.gasmargin.process.StepResult.Credited;

/** The quantities of a step on its modelled path, with the uncertainty set against the user. */
final class ModelledValues {
  private static final List<ResultQuantity> ALL =
      List.of(
          PEAK_GAS_TEMPERATURE,
          LOWEST_GAS_TEMPERATURE,
          PEAK_PRESSURE,
          LOWEST_PRESSURE,
          PEAK_METAL_TEMPERATURE,
          LOWEST_METAL_TEMPERATURE,
          DURATION,
          MEAN_PRESSURE_RATE);

  private ModelledValues() {}

  /** Adds every quantity of the modelled path, or why there is none. */
  static void add(StepResult result, StepValues values) {
    Optional<Path> path = result.path(PathKind.MODELLED);
    if (result.credited().isPresent() && path.isPresent()) {
      add(result.credited().get(), path.get(), values);
    } else {
      String reason = "there is no modelled path to judge on" + why(result);
      ALL.forEach(quantity -> values.unknown(quantity, reason));
    }
  }

  private static void add(Credited credited, Path path, StepValues values) {
    String words = "modelled path, " + credited.allowance();
    values.put(PEAK_GAS_TEMPERATURE, credited.highestGasTemperature(), words);
    values.put(LOWEST_GAS_TEMPERATURE, credited.lowestGasTemperature(), words);
    values.put(PEAK_PRESSURE, credited.highestPressure(), words);
    values.put(LOWEST_PRESSURE, credited.lowestPressure(), words);
    addWall(PEAK_METAL_TEMPERATURE, credited.highestWallTemperature(), words, values);
    addWall(LOWEST_METAL_TEMPERATURE, credited.lowestWallTemperature(), words, values);
    values.put(DURATION, path.duration(), "");
    values.putPressureRate();
  }

  private static void addWall(
      ResultQuantity quantity, OptionalDouble si, String words, StepValues values) {
    if (si.isPresent()) {
      values.put(quantity, si.getAsDouble(), words);
    } else {
      values.unknown(quantity, "no wall was computed");
    }
  }

  private static String why(StepResult result) {
    PathOutcome outcome = result.paths().get(PathKind.MODELLED);
    if (outcome instanceof PathOutcome.Absent absent) {
      return ": " + absent.reason();
    }
    return outcome instanceof PathOutcome.Failed failed ? ": " + failed.reason() : "";
  }
}
