package org.gasmargin.process.bounds;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.gasmargin.gas.State;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;

/**
 * The path of gas that the incoming gas pushes ahead without mixing: the isentrope from the start
 * of the step, at the pressures of the adiabatic path.
 */
final class UnmixedPath {
  private UnmixedPath() {}

  /**
   * Follows the trapped gas through a fill or a compression.
   *
   * @param start state at the start of the step
   * @param mean path of the mean gas without heat exchange
   * @throws org.gasmargin.gas.OutsideValidity if the isentrope leaves the range of the equation
   */
  static Path follow(StepPlan plan, State start, Path mean) {
    List<PathPoint> points = new ArrayList<>();
    double mass =
        start.molarDensity() * plan.vessel().gas().molarMass() * plan.vessel().volume().nominal();
    double peak = start.temperature();
    double highest = start.pressure();
    for (PathPoint point : mean.points()) {
      State state = plan.vessel().gas().atPressureEntropy(point.pressure(), start.entropy());
      peak = Math.max(peak, state.temperature());
      highest = Math.max(highest, state.pressure());
      points.add(
          new PathPoint(
              point.time(),
              state.pressure(),
              state.temperature(),
              mass,
              0,
              OptionalDouble.empty(),
              OptionalDouble.empty()));
    }
    return new Path(
        points,
        peak,
        start.temperature(),
        highest,
        start.pressure(),
        OptionalDouble.empty(),
        OptionalDouble.empty());
  }
}
