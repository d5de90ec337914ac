package org.gasmargin.gas.transport;

import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Dense part of the viscosity, Pa s: sum a d^d1 t^t1 exp(gamma d^l) with d = rho/rhor and t = Tr/T.
 *
 * @param reducingTemperature Tr, K
 * @param reducingDensity rhor, mol/m3
 * @param terms rows a, d1, t1, -gamma, l
 */
public record BatschinskiHildebrand(
    double reducingTemperature, double reducingDensity, PowerSum terms)
    implements ToDoubleFunction<State> {
  @Override
  public double applyAsDouble(State state) {
    double d = state.molarDensity() / reducingDensity;
    double t = reducingTemperature / state.temperature();
    return terms.damped(d, t);
  }
}
