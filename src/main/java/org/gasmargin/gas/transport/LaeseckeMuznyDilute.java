package org.gasmargin.gas.transport;

import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * Viscosity of dilute carbon dioxide, Pa s, at T, K, after Laesecke and Muzny: C sqrt(T) / (a0 + a1
 * T^(1/6) + a2 exp(a3 T^(1/3)) + (a4 + a5 T^(1/3)) exp(-T^(1/3)) + a6 sqrt(T)).
 *
 * @param factor C
 * @param a coefficients a0 to a6
 */
public record LaeseckeMuznyDilute(double factor, List<Double> a) implements DoubleUnaryOperator {
  @Override
  public double applyAsDouble(double temperature) {
    double root = Math.sqrt(temperature);
    double third = Math.cbrt(temperature);
    return factor
        * root
        / (a.get(0)
            + a.get(1) * Math.sqrt(third)
            + a.get(2) * Math.exp(a.get(3) * third)
            + (a.get(4) + a.get(5) * third) * Math.exp(-third)
            + a.get(6) * root);
  }
}
