package org.gasmargin.gas;

/**
 * A single-phase equilibrium state with its first derivatives. SI and molar; the energy and entropy
 * datum is that of the gas's equation of state, so only differences within one gas have a meaning.
 *
 * @param temperature T, K
 * @param molarDensity rho, mol/m3
 * @param pressure p, Pa
 * @param internalEnergy u, J/mol
 * @param enthalpy h, J/mol
 * @param entropy s, J/(mol K)
 * @param cv isochoric heat capacity, J/(mol K)
 * @param cp isobaric heat capacity, J/(mol K)
 * @param speedOfSound w, m/s
 * @param dpdT (dp/dT) at constant density, Pa/K
 * @param dpdRho (dp/drho) at constant temperature, Pa m3/mol
 */
public record State(
    double temperature,
    double molarDensity,
    double pressure,
    double internalEnergy,
    double enthalpy,
    double entropy,
    double cv,
    double cp,
    double speedOfSound,
    double dpdT,
    double dpdRho) {

  /** (du/drho) at constant temperature, J m3/mol2. */
  public double dudRho() {
    return (pressure - temperature * dpdT) / (molarDensity * molarDensity);
  }

  /** Isentropic exponent k of p v^k = constant, the real-gas counterpart of cp/cv. */
  public double isentropicExponent() {
    return molarDensity / pressure * (cp / cv) * dpdRho;
  }

  /** Volume expansivity beta = -(1/rho)(drho/dT) at constant pressure, 1/K. */
  public double expansivity() {
    return dpdT / (molarDensity * dpdRho);
  }
}
