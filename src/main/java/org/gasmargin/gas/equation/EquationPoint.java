package org.gasmargin.gas.equation;

import org.gasmargin.gas.State;

/**
 * One temperature and density of a {@link HelmholtzEquation}, movable, for iterations on one
 * thread. A move that keeps the temperature or the density keeps the work that depends on it alone.
 * Numbers are those of the equation: nothing here asks whether the phase is stable or the range is
 * kept.
 */
public final class EquationPoint {
  private final HelmholtzEquation equation;
  private final ResidualTerms.Evaluator[] evaluators;
  private final ReducedSum residual = new ReducedSum();
  private final ReducedSum ideal = new ReducedSum();
  private double temperature = Double.NaN;
  private double density = Double.NaN;
  private double idealTemperature = Double.NaN;

  EquationPoint(HelmholtzEquation equation) {
    this.equation = equation;
    evaluators = new ResidualTerms.Evaluator[equation.residual.size()];
    for (int i = 0; i < evaluators.length; i++) {
      evaluators[i] = equation.residual.get(i).evaluator();
    }
  }

  /**
   * Moves the point.
   *
   * @param newTemperature T, K, above zero
   * @param newDensity rho, mol/m3, above zero
   */
  public EquationPoint moveTo(double newTemperature, double newDensity) {
    temperature = newTemperature;
    density = newDensity;
    double tau = equation.reducingTemperature / newTemperature;
    double delta = newDensity / equation.reducingDensity;
    residual.clear();
    for (ResidualTerms.Evaluator evaluator : evaluators) {
      evaluator.addTo(residual, tau, delta);
    }
    return this;
  }

  private ReducedSum ideal() {
    if (idealTemperature != temperature) {
      ideal.clear();
      double tau = equation.reducingTemperature / temperature;
      for (IdealTerms terms : equation.ideal) {
        terms.addTo(ideal, tau);
      }
      idealTemperature = temperature;
    }
    return ideal;
  }

  /** T, K. */
  public double temperature() {
    return temperature;
  }

  /** rho, mol/m3. */
  public double density() {
    return density;
  }

  /** p, Pa. */
  public double pressure() {
    return density * equation.gasConstant * temperature * (1 + residual.d);
  }

  /** (dp/drho) at constant temperature, Pa m3/mol. */
  public double dpdRho() {
    return equation.gasConstant * temperature * (1 + 2 * residual.d + residual.dd);
  }

  /** (dp/dT) at constant density, Pa/K. */
  public double dpdT() {
    return density * equation.gasConstant * (1 + residual.d - residual.dt);
  }

  /** u, J/mol. */
  public double internalEnergy() {
    return equation.gasConstant * temperature * (ideal().t + residual.t);
  }

  /** h, J/mol. */
  public double enthalpy() {
    return internalEnergy() + pressure() / density;
  }

  /** s, J/(mol K). */
  public double entropy() {
    ReducedSum alpha0 = ideal();
    double logDelta = Math.log(density / equation.reducingDensity);
    return equation.gasConstant
        * (alpha0.t + residual.t - alpha0.value - logDelta - residual.value);
  }

  /** Isochoric heat capacity cv, J/(mol K). */
  public double cv() {
    return -equation.gasConstant * (ideal().tt + residual.tt);
  }

  /** Isobaric heat capacity cp, J/(mol K). */
  public double cp() {
    double x = 1 + residual.d - residual.dt;
    return cv() + equation.gasConstant * x * x / (1 + 2 * residual.d + residual.dd);
  }

  /** Residual part of g/(R T) plus ln(delta): equal in coexisting phases. */
  public double reducedGibbs() {
    return residual.value + residual.d + Math.log(density / equation.reducingDensity);
  }

  /** The properties at this point. */
  public State toState() {
    double pressure = pressure();
    double energy = internalEnergy();
    double cv = cv();
    double cp = cp();
    double dpdRho = dpdRho();
    return new State(
        temperature,
        density,
        pressure,
        energy,
        energy + pressure / density,
        entropy(),
        cv,
        cp,
        Math.sqrt(cp / cv * dpdRho / equation.molarMass),
        dpdT(),
        dpdRho);
  }
}
