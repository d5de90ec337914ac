package org.gasmargin.gas.transport;

import java.util.List;
import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;

/**
 * Dense part of the viscosity of hydrogen, Pa s, found by symbolic regression: c0 r^2 exp(c1 t +
 * c2/t + c3 r^2/(c4 + t) + c5 r^6) with t = T/Tr and r the mass density in units of its scale.
 *
 * @param molarMass kg/mol
 * @param reducingTemperature Tr, K
 * @param densityScale factor from kg/m3 to r
 * @param c coefficients c0 to c5
 */
public record MuznyViscosity(
    double molarMass, double reducingTemperature, double densityScale, List<Double> c)
    implements ToDoubleFunction<State> {
  @Override
  public double applyAsDouble(State state) {
    double t = state.temperature() / reducingTemperature;
    double r = state.molarDensity() * molarMass * densityScale;
    double r2 = r * r;
    double exponent =
        c.get(1) * t + c.get(2) / t + c.get(3) * r2 / (c.get(4) + t) + c.get(5) * r2 * r2 * r2;
    return c.get(0) * r2 * Math.exp(exponent);
  }
}
