package org.gasmargin.gas.transport;

import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Viscosity of water by the IAPWS formulation of 2008 with its critical enhancement. Symbols are
 * those of the release.
 *
 * @param molarMass kg/mol
 * @param reducingTemperature K
 * @param reducingMassDensity kg/m3
 * @param dilute rows a, i of sum a (Tr/T)^i
 * @param residual rows a, i, j of sum a (Tr/T - 1)^i (rho/rhor - 1)^j
 * @param length correlation length, nm
 * @param exponent x_mu of the enhancement
 * @param cutoffC q_C, 1/nm
 * @param cutoffD q_D, 1/nm
 * @param switchLength correlation length below which a series is used, nm
 */
public record WaterIapwsViscosity(
    double molarMass,
    double reducingTemperature,
    double reducingMassDensity,
    PowerSum dilute,
    PowerSum residual,
    WaterCorrelationLength length,
    double exponent,
    double cutoffC,
    double cutoffD,
    double switchLength)
    implements Viscosity {
  /** The formulation counts in micropascal seconds. */
  private static final double PASCAL_SECOND = 1e-6;

  @Override
  public double at(State state) {
    double t = reducingTemperature / state.temperature();
    double r = state.molarDensity() * molarMass / reducingMassDensity;
    double mu0 = 100 / (Math.sqrt(t) * dilute.at(t));
    double mu1 = Math.exp(r * residual.at(t - 1, r - 1));
    return PASCAL_SECOND * mu0 * mu1 * Math.exp(exponent * crossover(length.at(state)));
  }

  private double crossover(double xi) {
    double c = cutoffC * xi;
    double d = cutoffD * xi;
    if (xi <= switchLength) {
      return c / 5 * Math.pow(d, 5) * (1 - c + c * c - 765.0 / 504 * d * d);
    }
    double psi = Math.acos(1 / Math.sqrt(1 + d * d));
    double w = Math.sqrt(Math.abs((c - 1) / (c + 1))) * Math.tan(psi / 2);
    double l = c > 1 ? Math.log((1 + w) / (1 - w)) : 2 * Math.atan(Math.abs(w));
    double c2 = c * c;
    return Math.sin(3 * psi) / 12
        - Math.sin(2 * psi) / (4 * c)
        + (1 - 1.25 * c2) * Math.sin(psi) / c2
        - ((1 - 1.5 * c2) * psi - Math.pow(Math.abs(c2 - 1), 1.5) * l) / (c2 * c);
  }
}
