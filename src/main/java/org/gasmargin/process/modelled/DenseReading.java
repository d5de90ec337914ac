package org.gasmargin.process.modelled;

import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;

/**
 * Reads unknowns between the ends of an accepted step.
 *
 * <p>On a pressure ramp the integrator takes long steps where little heat passes, because a fill
 * without heat has no error whatever its step. There the straight reading of temperature and extent
 * would be poor. Instead energy and extent are read by cubics and moved, along the line on which
 * their errors lie, onto the prescribed pressure.
 */
final class DenseReading {
  private static final int MOST_ITERATIONS = 30;

  /** Last relative change of the iteration, whose error falls with its square. */
  private static final double LAST_CHANGE = 1e-9;

  private final GasWallSystem system;
  private final GasSide side;

  DenseReading(GasWallSystem system) {
    this.system = system;
    this.side = system.side();
  }

  /** Unknowns at a time within a step, with everything that is set by an equation satisfying it. */
  double[] at(DenseStep step, double time) {
    if (time == step.end()) {
      return step.endUnknowns();
    }
    double[] z = step.at(time);
    if (side.opening() instanceof Opening.Ramp ramp) {
      moveOnto(ramp.pressure(time), energy(step, time), z);
    }
    system.makeConsistent(z);
    return z;
  }

  /** Internal energy of the gas by the cubic of Hermite, J. */
  private double energy(DenseStep step, double time) {
    return DenseStep.cubic(
        step.end() - step.start(),
        (time - step.start()) / (step.end() - step.start()),
        side.energy(system.gas(step.startUnknowns()), step.startUnknowns()[GasWallSystem.EXTENT]),
        side.energy(system.gas(step.endUnknowns()), step.endUnknowns()[GasWallSystem.EXTENT]),
        energySlope(step.startUnknowns(), step.startSlopes()),
        energySlope(step.endUnknowns(), step.endSlopes()));
  }

  private double energySlope(double[] z, double[] slopes) {
    State state = system.gas(z);
    double extent = z[GasWallSystem.EXTENT];
    return side.heatCapacity(state, extent) * slopes[GasWallSystem.TEMPERATURE]
        + side.energyByExtent(state, extent) * slopes[GasWallSystem.EXTENT];
  }

  /** Solves p(T, x) = pressure and U(T, x) - e x = energy - e x_read by Newton's method. */
  private void moveOnto(double pressure, double energy, double[] z) {
    double carried = side.carried().energy(system.gas(z));
    double kept = energy - carried * z[GasWallSystem.EXTENT];
    for (int iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
      State state = system.gas(z);
      double extent = z[GasWallSystem.EXTENT];
      double overPressure = state.pressure() - pressure;
      double excess = side.energy(state, extent) - carried * extent - kept;
      double byExtent = side.energyByExtent(state, extent) - carried;
      double pressureByExtent = state.dpdRho() * side.content().densitySlope(extent);
      double capacity = side.heatCapacity(state, extent);
      double determinant = state.dpdT() * byExtent - pressureByExtent * capacity;
      double warmer = (overPressure * byExtent - pressureByExtent * excess) / determinant;
      double further = (state.dpdT() * excess - capacity * overPressure) / determinant;
      z[GasWallSystem.TEMPERATURE] -= warmer;
      z[GasWallSystem.EXTENT] -= further;
      if (Math.abs(warmer) <= LAST_CHANGE * state.temperature()
          && Math.abs(further) <= LAST_CHANGE * extent) {
        return;
      }
    }
    throw new OutsideValidity("a point between two steps of the ramp could not be found");
  }
}
