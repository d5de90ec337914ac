package org.gasmargin.process.simulation;

import java.util.OptionalDouble;
import org.gasmargin.process.Path;

/** The extremes of a modelled path that rules can judge. */
enum ModelledExtreme {
  HIGHEST_GAS_TEMPERATURE(true),
  LOWEST_GAS_TEMPERATURE(false),
  HIGHEST_PRESSURE(true),
  LOWEST_PRESSURE(false),
  HIGHEST_WALL_TEMPERATURE(true),
  LOWEST_WALL_TEMPERATURE(false);

  private final boolean highest;

  ModelledExtreme(boolean highest) {
    this.highest = highest;
  }

  /** The extreme on a path, K or Pa absolute; empty if the path has none. */
  OptionalDouble of(Path path) {
    return switch (this) {
      case HIGHEST_GAS_TEMPERATURE -> OptionalDouble.of(path.peakGasTemperature());
      case LOWEST_GAS_TEMPERATURE -> OptionalDouble.of(path.lowestGasTemperature());
      case HIGHEST_PRESSURE -> OptionalDouble.of(path.peakPressure());
      case LOWEST_PRESSURE -> OptionalDouble.of(path.lowestPressure());
      case HIGHEST_WALL_TEMPERATURE -> path.peakWallTemperature();
      case LOWEST_WALL_TEMPERATURE -> path.lowestWallTemperature();
    };
  }

  /** The worse of two values. */
  double worse(double a, double b) {
    return highest ? Math.max(a, b) : Math.min(a, b);
  }
}
