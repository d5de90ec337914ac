package org.gasmargin.gas.transport;

import java.util.function.DoubleUnaryOperator;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Viscosity of the dilute gas, Pa s, at T, K: C sqrt(T) / sum a (T/Tr)^t.
 *
 * @param factor C
 * @param reducingTemperature Tr, K
 * @param terms rows a, t
 */
public record RootOverPowers(double factor, double reducingTemperature, PowerSum terms)
    implements DoubleUnaryOperator {
  @Override
  public double applyAsDouble(double temperature) {
    return factor * Math.sqrt(temperature) / terms.at(temperature / reducingTemperature);
  }
}
