package org.gasmargin.gas.transport;

import java.util.function.DoubleUnaryOperator;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Viscosity of the dilute gas, Pa s, at T, K, from kinetic theory: C sqrt(1000 M T) / ((1e9
 * sigma)^2 Omega) with ln Omega = sum a (ln T*)^t and T* = T/(epsilon/k).
 */
public final class CollisionIntegralViscosity implements DoubleUnaryOperator {
  private final double factor;
  private final double epsilonOverK;
  private final PowerSum terms;

  /**
   * @param c factor C
   * @param molarMass M, kg/mol
   * @param sigma size of the molecule, m
   * @param epsilonOverK depth of its potential, K
   * @param terms rows a, t
   */
  public CollisionIntegralViscosity(
      double c, double molarMass, double sigma, double epsilonOverK, PowerSum terms) {
    factor = c * Math.sqrt(1000 * molarMass) / Math.pow(1e9 * sigma, 2);
    this.epsilonOverK = epsilonOverK;
    this.terms = terms;
  }

  @Override
  public double applyAsDouble(double temperature) {
    double logOmega = terms.at(Math.log(temperature / epsilonOverK));
    return factor * Math.sqrt(temperature) / Math.exp(logOmega);
  }
}
