package org.gasmargin.gas.transport;

import java.util.function.DoubleUnaryOperator;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Conductivity of the dilute gas, W/(m K): A0 (1e6 eta0) + sum a (Tr/T)^t.
 *
 * @param viscosityFactor A0
 * @param diluteViscosity eta0, Pa s, of T, K
 * @param reducingTemperature Tr, K
 * @param terms rows a, t
 */
public record ViscosityAndPowers(
    double viscosityFactor,
    DoubleUnaryOperator diluteViscosity,
    double reducingTemperature,
    PowerSum terms)
    implements DoubleUnaryOperator {
  @Override
  public double applyAsDouble(double temperature) {
    return viscosityFactor * 1e6 * diluteViscosity.applyAsDouble(temperature)
        + terms.at(reducingTemperature / temperature);
  }
}
