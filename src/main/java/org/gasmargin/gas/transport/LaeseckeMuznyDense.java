package org.gasmargin.gas.transport;

import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;

/**
 * Dense part of the viscosity of carbon dioxide, Pa s, after Laesecke and Muzny: E (c1 t r^3 + (r^2
 * + r^gamma)/(t - c2)) with t = T/Tt and r the mass density over that of the liquid at the triple
 * point.
 */
public final class LaeseckeMuznyDense implements ToDoubleFunction<State> {
  private final double tripleTemperature;
  private final double tripleDensity;
  private final double unit;
  private final double c1;
  private final double c2;
  private final double gamma;

  /**
   * @param gasConstant J/(mol K)
   * @param molarMass kg/mol
   * @param tripleTemperature Tt, K
   * @param tripleMassDensity of the liquid at the triple point, kg/m3
   * @param reduction Avogadro's number to the power 1/3, less the units of the paper
   * @param c1 coefficient
   * @param c2 coefficient
   * @param gamma exponent
   */
  public LaeseckeMuznyDense(
      double gasConstant,
      double molarMass,
      double tripleTemperature,
      double tripleMassDensity,
      double reduction,
      double c1,
      double c2,
      double gamma) {
    this.tripleTemperature = tripleTemperature;
    this.tripleDensity = tripleMassDensity / molarMass;
    this.c1 = c1;
    this.c2 = c2;
    this.gamma = gamma;
    unit =
        Math.pow(tripleMassDensity, 2 / 3.0)
            * Math.sqrt(gasConstant * tripleTemperature)
            / (Math.pow(molarMass, 1 / 6.0) * reduction);
  }

  @Override
  public double applyAsDouble(State state) {
    double t = state.temperature() / tripleTemperature;
    double r = state.molarDensity() / tripleDensity;
    return unit * (c1 * t * r * r * r + (r * r + Math.pow(r, gamma)) / (t - c2));
  }
}
