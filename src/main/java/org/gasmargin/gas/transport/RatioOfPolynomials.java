package org.gasmargin.gas.transport;

import java.util.function.DoubleUnaryOperator;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Conductivity of the dilute gas, W/(m K): (sum a (T/Tr)^t) / (sum b (T/Tr)^t).
 *
 * @param reducingTemperature Tr, K
 * @param numerator rows a, t
 * @param denominator rows b, t
 */
public record RatioOfPolynomials(
    double reducingTemperature, PowerSum numerator, PowerSum denominator)
    implements DoubleUnaryOperator {
  @Override
  public double applyAsDouble(double temperature) {
    double x = temperature / reducingTemperature;
    return numerator.at(x) / denominator.at(x);
  }
}
