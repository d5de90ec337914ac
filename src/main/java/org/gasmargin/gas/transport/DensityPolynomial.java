package org.gasmargin.gas.transport;

import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Density part of the conductivity, W/(m K): sum a (rho/rhor)^d (Tr/T)^t exp(-gamma (rho/rhor)^l).
 *
 * @param reducingTemperature Tr, K
 * @param reducingDensity rhor, mol/m3
 * @param terms rows a, d, t, gamma, l
 */
public record DensityPolynomial(double reducingTemperature, double reducingDensity, PowerSum terms)
    implements ToDoubleFunction<State> {
  @Override
  public double applyAsDouble(State state) {
    double delta = state.molarDensity() / reducingDensity;
    double tau = reducingTemperature / state.temperature();
    return terms.damped(delta, tau);
  }
}
