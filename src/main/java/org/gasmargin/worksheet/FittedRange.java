package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.gasmargin.gas.Gas;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.StepResult;
import org.gasmargin.units.Dimension;
import org.gasmargin.worksheet.numbers.Scale;

/** Says where a procedure leaves the temperatures to which its equation of state was fitted. */
final class FittedRange {
  private final WorksheetContent content;
  private final Gas gas;

  FittedRange(WorksheetContent content, Gas gas) {
    this.content = content;
    this.gas = gas;
  }

  /** The warning; empty if no path and no extreme leaves the range. */
  Optional<String> warning() {
    double fitted = gas.validity().fittedMaxTemperature();
    List<String> beyond = new ArrayList<>();
    double hottest = fitted;
    for (StepResult result : content.result().steps()) {
      double peak = peak(result);
      Gas inside = content.result().procedure().vesselOf(result.step()).gas();
      if (peak > fitted && inside.id().equals(gas.id())) {
        beyond.add(result.step().id());
        hottest = Math.max(hottest, peak);
      }
    }
    if (beyond.isEmpty()) {
      return Optional.empty();
    }
    Scale temperature = Scale.of(Dimension.TEMPERATURE, content.units());
    return Optional.of(
        "step "
            + String.join(", ", beyond)
            + " reaches up to "
            + temperature.text(hottest, 1)
            + "; above "
            + temperature.text(fitted, 1)
            + " the equation of state of "
            + gas.name()
            + " extrapolates its data and its accuracy is not known.");
  }

  /** The highest temperature of all paths and extremes of a step, K. */
  private static double peak(StepResult result) {
    Stream<Double> paths =
        PathLook.ALL.stream()
            .flatMap(look -> result.path(look.kind()).stream())
            .map(path -> path.peakGasTemperature());
    Stream<Double> extremes =
        Stream.of(
                result.envelope().highestGasTemperature(),
                result.envelope().highestUnmixedTemperature())
            .flatMap(Optional::stream)
            .map(Extreme::value);
    return Stream.concat(paths, extremes).mapToDouble(value -> value).max().orElse(0);
  }
}
