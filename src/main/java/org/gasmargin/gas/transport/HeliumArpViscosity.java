package org.gasmargin.gas.transport;

import java.util.List;
import org.gasmargin.gas.State;

/**
 * Viscosity of helium after Arp, McCarty and Friend. With x = ln T (held at the cap above it), r
 * the density in g/cm3 and q(c) = c0/x + c1 + c2 x + c3 x^2 + c4 x^3, the logarithm of the
 * viscosity is q(dilute) + r q(second) + r^2 q(third) + r^3 q(fourth); above the switch the dilute
 * part is replaced by that of the hot gas.
 *
 * @param molarMass kg/mol
 * @param switchTemperature K
 * @param capTemperature K
 * @param dilute coefficients of r^0
 * @param second coefficients of r
 * @param third coefficients of r^2
 * @param fourth coefficients of r^3
 * @param hot h0 to h4 of h0 T^h1 exp(h2/T + h3/T^2 + h4)
 */
public record HeliumArpViscosity(
    double molarMass,
    double switchTemperature,
    double capTemperature,
    List<Double> dilute,
    List<Double> second,
    List<Double> third,
    List<Double> fourth,
    List<Double> hot)
    implements Viscosity {
  /** The correlation counts in micropoise. */
  private static final double PASCAL_SECOND = 1e-7;

  @Override
  public double at(State state) {
    double t = state.temperature();
    double r = state.molarDensity() * molarMass / 1000;
    double x = Math.log(Math.min(t, capTemperature));
    double logDilute = polynomial(dilute, x);
    double logarithm =
        logDilute
            + r * (polynomial(second, x) + r * (polynomial(third, x) + r * polynomial(fourth, x)));
    double viscosity = Math.exp(logarithm);
    if (t > switchTemperature) {
      double hotGas =
          hot.get(0)
              * Math.pow(t, hot.get(1))
              * Math.exp(hot.get(2) / t + hot.get(3) / (t * t) + hot.get(4));
      viscosity += hotGas - Math.exp(logDilute);
    }
    return viscosity * PASCAL_SECOND;
  }

  private static double polynomial(List<Double> c, double x) {
    return c.get(0) / x + c.get(1) + x * (c.get(2) + x * (c.get(3) + x * c.get(4)));
  }
}
