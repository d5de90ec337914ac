package org.gasmargin.gas.transport;

import java.util.function.DoubleUnaryOperator;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Conductivity of the dilute gas, W/(m K), at T, K: (T/Tr)^(1/2) / (1000 sum a (Tr/T)^i).
 *
 * @param reducingTemperature Tr, K
 * @param terms rows a, i
 */
public record RootOverPolynomial(double reducingTemperature, PowerSum terms)
    implements DoubleUnaryOperator {
  /** The correlation counts in mW/(m K). */
  private static final double WATT = 1e-3;

  @Override
  public double applyAsDouble(double temperature) {
    double t = reducingTemperature / temperature;
    return WATT / (Math.sqrt(t) * terms.at(t));
  }
}
