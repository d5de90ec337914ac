package org.gasmargin.gas.transport;

import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Dense part of the viscosity after Friend, Ely and Ingham: C (sum n d^i t^j) / (1 + sum n d^i t^j)
 * with d = rho/rhor and t = Tr/T, in the unit of C.
 *
 * @param factor C
 * @param reducingTemperature Tr, K
 * @param reducingDensity rhor, mol/m3
 * @param numerator rows n, i, j
 * @param denominator rows n, i, j
 */
public record RatioOfDensitySums(
    double factor,
    double reducingTemperature,
    double reducingDensity,
    PowerSum numerator,
    PowerSum denominator)
    implements ToDoubleFunction<State> {
  @Override
  public double applyAsDouble(State state) {
    double d = state.molarDensity() / reducingDensity;
    double t = reducingTemperature / state.temperature();
    return factor * numerator.at(d, t) / (1 + denominator.at(d, t));
  }
}
