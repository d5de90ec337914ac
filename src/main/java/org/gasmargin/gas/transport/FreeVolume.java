package org.gasmargin.gas.transport;

import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Part of the viscosity, Pa s, that grows towards close packing: (sum f d^i t^j) (1/(d0 - d) -
 * 1/d0) with d = rho/rhor, t = Tr/T and the close-packed density d0 = sum g t^h.
 *
 * @param reducingTemperature Tr, K
 * @param reducingDensity rhor, mol/m3
 * @param numerator rows f, i, j
 * @param closePacking rows g, h
 */
public record FreeVolume(
    double reducingTemperature, double reducingDensity, PowerSum numerator, PowerSum closePacking)
    implements ToDoubleFunction<State> {
  @Override
  public double applyAsDouble(State state) {
    double d = state.molarDensity() / reducingDensity;
    double t = reducingTemperature / state.temperature();
    double d0 = closePacking.at(t);
    return numerator.at(d, t) * (1 / (d0 - d) - 1 / d0);
  }
}
