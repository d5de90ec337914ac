package org.gasmargin.gas.transport;

import java.util.List;
import java.util.Locale;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;

/**
 * Thermal conductivity of helium after Hands and Arp, without the critical enhancement, which is
 * zero outside 3.5 K to 12 K; so the correlation begins at 12 K.
 *
 * @param molarMass kg/mol
 * @param minTemperature lowest temperature of use, K
 * @param criticalMassDensity kg/m3
 * @param dilute l0, l1 of l0 T^l1 exp(sum e_i T^-(i+1))
 * @param diluteExponents e_i
 * @param residual coefficients of the density part
 */
public record HeliumHandsConductivity(
    double molarMass,
    double minTemperature,
    double criticalMassDensity,
    List<Double> dilute,
    List<Double> diluteExponents,
    List<Double> residual)
    implements Conductivity {
  @Override
  public double at(State state) {
    double t = state.temperature();
    if (!(t >= minTemperature)) {
      throw new OutsideValidity(
          String.format(
              Locale.ROOT,
              "the correlation of the thermal conductivity of helium begins at %.6g K, asked was"
                  + " %.6g K",
              minTemperature,
              t));
    }
    double exponent = 0;
    double inverse = 1;
    for (double e : diluteExponents) {
      inverse /= t;
      exponent += e * inverse;
    }
    double r = state.molarDensity() * molarMass;
    double a = Math.cbrt(t);
    double b = a * a;
    List<Double> c = residual;
    return dilute.get(0) * Math.pow(t, dilute.get(1)) * Math.exp(exponent)
        + (c.get(0) + c.get(1) * t + c.get(2) * a + c.get(3) * b) * r
        + (c.get(4) + c.get(5) * a + c.get(6) * b) * r * r * r
        + (c.get(7) + c.get(8) * a + c.get(9) * b + c.get(10) / t)
            * r
            * r
            * Math.log(r / criticalMassDensity);
  }
}
