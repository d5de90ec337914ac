package org.gasmargin.process.modelled;

import org.gasmargin.gas.State;
import org.gasmargin.process.Closure;

/**
 * The balances of a step, from the states of gas and wall at its two ends and what flowed between.
 *
 * <p>Energy: rise of the gas and of the wall, less what came with the flow or as work, plus the
 * heat to the surroundings; where the gas touches only part of the wall, the heat that its balance
 * and that of the wall do not share. Measured against the largest of these terms and of the thermal
 * energy n cv T of the gas at either end, which is there so that a step in which nothing happens
 * has a measure.
 */
final class Balance {
  private final GasWallSystem system;

  Balance(GasWallSystem system) {
    this.system = system;
  }

  /** The residuals of a solution. */
  Closure closure(Trajectory trajectory) {
    double[] before = trajectory.steps().get(0).startUnknowns();
    double[] after = trajectory.endUnknowns();
    double[] flows = trajectory.flows();
    double gasRise = energy(after) - energy(before);
    double wallRise = system.wallRise(before, after);
    double carried = flows[GasWallSystem.FLOW_ENERGY];
    double gasHeat = flows[GasWallSystem.FLOW_GAS_HEAT];
    double wallHeat = flows[GasWallSystem.FLOW_WALL_HEAT];
    double lost = flows[GasWallSystem.FLOW_LOST_HEAT];
    double residual = Math.abs((gasRise - carried + gasHeat) + (wallRise - wallHeat + lost));
    double measure =
        largest(
            gasRise, wallRise, carried, gasHeat, lost, thermalEnergy(before), thermalEnergy(after));
    return new Closure(massResidual(before, after, flows), residual / measure);
  }

  private double massResidual(double[] before, double[] after, double[] flows) {
    if (!(system.side().content() instanceof Content.Rigid)) {
      return 0; // a trapped amount is a constant of the equations
    }
    double start = before[GasWallSystem.EXTENT];
    double end = after[GasWallSystem.EXTENT];
    return Math.abs(end - start - flows[GasWallSystem.FLOW_EXTENT]) / Math.max(start, end);
  }

  private double energy(double[] z) {
    return amount(z) * system.gas(z).internalEnergy();
  }

  private double thermalEnergy(double[] z) {
    State state = system.gas(z);
    return amount(z) * state.cv() * state.temperature();
  }

  private double amount(double[] z) {
    return system.side().content().amount(z[GasWallSystem.EXTENT]);
  }

  private static double largest(double... terms) {
    double largest = 0;
    for (double term : terms) {
      largest = Math.max(largest, Math.abs(term));
    }
    return largest;
  }
}
