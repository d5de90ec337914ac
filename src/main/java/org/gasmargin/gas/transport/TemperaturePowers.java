package org.gasmargin.gas.transport;

import java.util.function.DoubleUnaryOperator;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Sum of a (T/Tr)^t, for example the viscosity of a dilute gas, Pa s.
 *
 * @param reducingTemperature Tr, K
 * @param terms rows a, t
 */
public record TemperaturePowers(double reducingTemperature, PowerSum terms)
    implements DoubleUnaryOperator {
  @Override
  public double applyAsDouble(double temperature) {
    return terms.at(temperature / reducingTemperature);
  }
}
