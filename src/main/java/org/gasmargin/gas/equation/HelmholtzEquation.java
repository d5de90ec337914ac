package org.gasmargin.gas.equation;

import java.util.List;

/**
 * A fundamental equation a/(R T) = alpha0(tau, delta) + alphar(tau, delta) with tau = Tr/T and
 * delta = rho/rhor, from which every equilibrium property follows by differentiation. Immutable.
 */
public final class HelmholtzEquation {
  final double gasConstant;
  final double molarMass;
  final double reducingTemperature;
  final double reducingDensity;
  final List<IdealTerms> ideal;
  final List<ResidualTerms> residual;

  /**
   * @param gasConstant R of the fit, J/(mol K); it differs between equations
   * @param molarMass kg/mol
   * @param reducingTemperature Tr, K
   * @param reducingDensity rhor, mol/m3
   * @param ideal terms of alpha0 besides ln(delta)
   * @param residual terms of alphar
   */
  public HelmholtzEquation(
      double gasConstant,
      double molarMass,
      double reducingTemperature,
      double reducingDensity,
      List<IdealTerms> ideal,
      List<ResidualTerms> residual) {
    this.gasConstant = gasConstant;
    this.molarMass = molarMass;
    this.reducingTemperature = reducingTemperature;
    this.reducingDensity = reducingDensity;
    this.ideal = List.copyOf(ideal);
    this.residual = List.copyOf(residual);
  }

  /** A point of this equation, to be moved about by one thread. */
  public EquationPoint newPoint() {
    return new EquationPoint(this);
  }

  /** Gas constant R of the fit, J/(mol K). */
  public double gasConstant() {
    return gasConstant;
  }

  /** Molar mass, kg/mol. */
  public double molarMass() {
    return molarMass;
  }

  /** Density that reduces delta, mol/m3. */
  public double reducingDensity() {
    return reducingDensity;
  }

  /** Temperature that reduces tau, K. */
  public double reducingTemperature() {
    return reducingTemperature;
  }

  /**
   * Heat capacity cp at zero pressure, J/(mol K).
   *
   * @param temperature T, K, above zero
   */
  public double idealCp(double temperature) {
    ReducedSum sum = new ReducedSum();
    for (IdealTerms terms : ideal) {
      terms.addTo(sum, reducingTemperature / temperature);
    }
    return gasConstant * (1 - sum.tt);
  }
}
