package org.gasmargin.process.simulation;

import java.util.Locale;
import java.util.Optional;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathOutcome;

/** The check, at run time, that the modelled path lies within the envelope. */
final class BoundsCheck {
  /** Resolution of temperatures on both sides, K. */
  private static final double KELVIN = 0.01;

  /** Resolution of pressures on both sides, relative. */
  private static final double PRESSURE = 1e-5;

  private BoundsCheck() {}

  /** What contradicts, in words; empty if nothing does or there is nothing to compare. */
  static Optional<String> failure(Envelope envelope, PathOutcome modelled) {
    if (!(modelled instanceof PathOutcome.Computed computed)) {
      return Optional.empty();
    }
    Path path = computed.path();
    return above(
            "gas temperature, K",
            path.peakGasTemperature(),
            envelope.highestGasTemperature(),
            KELVIN)
        .or(
            () ->
                below(
                    "gas temperature, K",
                    path.lowestGasTemperature(),
                    envelope.lowestGasTemperature(),
                    KELVIN))
        .or(
            () ->
                above(
                    "pressure, Pa",
                    path.peakPressure(),
                    envelope.highestPressure(),
                    PRESSURE * path.peakPressure()))
        .or(
            () ->
                below(
                    "pressure, Pa",
                    path.lowestPressure(),
                    envelope.lowestPressure(),
                    PRESSURE * path.lowestPressure()));
  }

  private static Optional<String> above(
      String quantity, double value, Optional<Extreme> bound, double resolution) {
    return bound
        .filter(extreme -> !(value <= extreme.value() + resolution))
        .map(extreme -> words(quantity, value, "above the highest", extreme));
  }

  private static Optional<String> below(
      String quantity, double value, Optional<Extreme> bound, double resolution) {
    return bound
        .filter(extreme -> !(value >= extreme.value() - resolution))
        .map(extreme -> words(quantity, value, "below the lowest", extreme));
  }

  private static String words(String quantity, double value, String where, Extreme bound) {
    return String.format(
        Locale.ROOT,
        "the modelled path contradicts its bounds: %s %.6g is %s bound %.6g",
        quantity,
        value,
        where,
        bound.value());
  }
}
