package org.gasmargin.process;

import java.util.List;
import java.util.OptionalDouble;

/**
 * One way through one step.
 *
 * @param points in rising time, from the start (time 0) to the end of the step
 * @param peakGasTemperature K
 * @param lowestGasTemperature K
 * @param peakPressure Pa absolute
 * @param lowestPressure Pa absolute
 * @param peakWallTemperature highest temperature at the inner or outer surface, K
 * @param lowestWallTemperature lowest temperature at the inner or outer surface, K
 */
public record Path(
    List<PathPoint> points,
    double peakGasTemperature,
    double lowestGasTemperature,
    double peakPressure,
    double lowestPressure,
    OptionalDouble peakWallTemperature,
    OptionalDouble lowestWallTemperature) {

  /** Copies the list; refuses an empty path and numbers that are not finite. */
  public Path {
    points = List.copyOf(points);
    if (points.isEmpty()) {
      throw new IllegalArgumentException("a path needs points");
    }
    if (!Double.isFinite(
        peakGasTemperature + lowestGasTemperature + peakPressure + lowestPressure)) {
      throw new IllegalArgumentException("a path needs finite extremes");
    }
  }

  /** The start of the step. */
  public PathPoint first() {
    return points.get(0);
  }

  /** The end of the step. */
  public PathPoint last() {
    return points.get(points.size() - 1);
  }

  /** Duration of the step on this path, s. */
  public double duration() {
    return last().time();
  }
}
