package org.gasmargin.gas.transport;

import java.util.List;
import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.HelmholtzEquation;
import org.gasmargin.gas.equation.PowerSum;
import org.gasmargin.gas.phase.Ancillary;

/**
 * Thermal conductivity of methane after Friend, Ely and Ingham. The separate scaled form within 3 %
 * of the critical point is not carried. Symbols are those of the paper: t = Tr/T, d = rho/rhor.
 */
public final class MethaneFriendConductivity implements Conductivity {
  /** The correlation counts in mW/(m K). */
  private static final double WATT = 1e-3;

  /**
   * Coefficients.
   *
   * @param reducingTemperature Tr, K
   * @param reducingDensity rhor, mol/m3
   * @param diluteViscosityFactor of the dilute viscosity, 1e-6 Pa s
   * @param epsilonOverK K
   * @param diluteViscosity rows a, three times the exponent of T*
   * @param excessViscosityFactor of the excess viscosity, 1e-6 Pa s
   * @param excessNumerator rows n, d, t
   * @param excessDenominator rows n, d, t
   * @param diluteFactor of the dilute conductivity
   * @param internal f0, f1 of the internal degrees of freedom
   * @param residualFactor of the density part
   * @param residual rows n, d, t
   * @param saturation factor of the term along the vapour line
   * @param criticalFactor of the enhancement
   * @param criticalAmplitude of the susceptibility
   * @param criticalPower of the susceptibility
   * @param decay FT, Frho, FA
   */
  public record Coefficients(
      double reducingTemperature,
      double reducingDensity,
      double diluteViscosityFactor,
      double epsilonOverK,
      PowerSum diluteViscosity,
      double excessViscosityFactor,
      PowerSum excessNumerator,
      PowerSum excessDenominator,
      double diluteFactor,
      List<Double> internal,
      double residualFactor,
      PowerSum residual,
      double saturation,
      double criticalFactor,
      double criticalAmplitude,
      double criticalPower,
      List<Double> decay) {}

  private final Coefficients c;
  private final HelmholtzEquation equation;
  private final double criticalTemperature;
  private final double criticalDensity;
  private final Ancillary vapourDensity;

  /**
   * @param coefficients of the correlation
   * @param equation equation of state
   * @param criticalTemperature of the equation of state, K
   * @param criticalDensity of the equation of state, mol/m3
   * @param vapourDensity density of the saturated vapour, mol/m3
   */
  public MethaneFriendConductivity(
      Coefficients coefficients,
      HelmholtzEquation equation,
      double criticalTemperature,
      double criticalDensity,
      Ancillary vapourDensity) {
    this.c = coefficients;
    this.equation = equation;
    this.criticalTemperature = criticalTemperature;
    this.criticalDensity = criticalDensity;
    this.vapourDensity = vapourDensity;
  }

  @Override
  public double at(State state) {
    double t = c.reducingTemperature / state.temperature();
    double d = state.molarDensity() / c.reducingDensity;
    double reduced = state.temperature() / c.epsilonOverK;
    double diluteViscosity =
        c.diluteViscosityFactor * Math.sqrt(reduced) * c.diluteViscosity.at(Math.cbrt(reduced));
    return WATT
        * (dilute(state, reduced, diluteViscosity)
            + residual(state, d, t)
            + critical(state, d, t, diluteViscosity));
  }

  private double dilute(State state, double reduced, double diluteViscosity) {
    double heat = equation.idealCp(state.temperature()) / equation.gasConstant() - 2.5;
    double coupling = c.internal.get(0) + c.internal.get(1) / reduced;
    return c.diluteFactor * diluteViscosity * (3.75 + coupling * heat);
  }

  private double residual(State state, double d, double t) {
    boolean gasOrLiquid =
        state.temperature() < criticalTemperature && state.molarDensity() < criticalDensity;
    double k = gasOrLiquid ? vapourDensity.at(state.temperature()) / criticalDensity : 1;
    return c.residualFactor * (c.residual.at(d, t) + c.saturation * d * d / k);
  }

  private double critical(State state, double d, double t, double diluteViscosity) {
    double viscosity =
        diluteViscosity
            + c.excessViscosityFactor
                * c.excessNumerator.at(d, t)
                / (1 + c.excessDenominator.at(d, t));
    // The published form multiplies derivatives of the equation of state by its own d and t, which
    // differ from delta and tau in the fifth digit.
    double r = equation.gasConstant();
    double z = state.pressure() / (state.molarDensity() * r * state.temperature());
    double alphaD = z - 1;
    double alphaDt = z - state.dpdT() / (state.molarDensity() * r);
    double alphaDd = state.dpdRho() / (r * state.temperature()) - 1 - 2 * alphaD;
    double scaleD = equation.reducingDensity() / c.reducingDensity;
    double scaleT = c.reducingTemperature / equation.reducingTemperature();
    double thermal = 1 + scaleD * (alphaD - scaleT * alphaDt);
    double stiffness = 1 + scaleD * (2 * alphaD + scaleD * alphaDd);
    double decay =
        c.decay.get(0) * Math.sqrt(Math.abs(1 - 1 / t))
            + c.decay.get(1) * (1 - d) * (1 - d)
            + c.decay.get(2) * (1 - d);
    return c.criticalFactor
        / (viscosity * t * t)
        * thermal
        * thermal
        * Math.pow(c.criticalAmplitude * d * t / stiffness, c.criticalPower)
        * Math.exp(-decay);
  }
}
