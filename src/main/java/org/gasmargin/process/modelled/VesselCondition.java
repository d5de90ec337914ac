package org.gasmargin.process.modelled;

import java.util.List;

/**
 * What a vessel holds between two steps of a modelled path.
 *
 * @param volume m3
 * @param amount of gas, mol
 * @param temperature of the gas, K
 * @param wall temperature of each wall cell from the inside, K; empty if there is no wall
 */
public record VesselCondition(double volume, double amount, double temperature, List<Double> wall) {

  /** Copies the list; refuses numbers that are not finite and above zero. */
  public VesselCondition {
    wall = List.copyOf(wall);
    if (!isPositive(volume) || !isPositive(amount) || !isPositive(temperature)) {
      throw new IllegalArgumentException("volume, amount and temperature must be above zero");
    }
    if (!wall.stream().allMatch(VesselCondition::isPositive)) {
      throw new IllegalArgumentException("temperatures of the wall must be above zero");
    }
  }

  /** Molar density of the gas, mol/m3. */
  public double molarDensity() {
    return amount / volume;
  }

  private static boolean isPositive(double value) {
    return value > 0 && Double.isFinite(value);
  }
}
