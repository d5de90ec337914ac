package org.gasmargin.gas.transport;

import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.HelmholtzEquation;

/**
 * Enhancement of the conductivity around the critical point, W/(m K), after the simplified
 * crossover theory of Olchowy and Sengers. Constants are named as in that theory.
 */
public final class OlchowySengers implements ToDoubleFunction<State> {
  /**
   * Constants of one fluid.
   *
   * @param boltzmann k, J/K
   * @param amplitude R0
   * @param nu universal exponent
   * @param gamma universal exponent
   * @param fluctuationAmplitude Gamma
   * @param correlationLength zeta0, m
   * @param cutoffWaveNumber qD, 1/m
   * @param referenceTemperature temperature without enhancement, K
   * @param criticalPressure Pa
   * @param criticalDensity mol/m3
   */
  public record Constants(
      double boltzmann,
      double amplitude,
      double nu,
      double gamma,
      double fluctuationAmplitude,
      double correlationLength,
      double cutoffWaveNumber,
      double referenceTemperature,
      double criticalPressure,
      double criticalDensity) {}

  private final Constants constants;
  private final HelmholtzEquation equation;
  private final Viscosity viscosity;

  /** Joins the constants with the fluid's equation of state and viscosity. */
  public OlchowySengers(Constants constants, HelmholtzEquation equation, Viscosity viscosity) {
    this.constants = constants;
    this.equation = equation;
    this.viscosity = viscosity;
  }

  @Override
  public double applyAsDouble(State state) {
    double length = correlationLength(state);
    if (length <= 0) {
      return 0;
    }
    double delta = state.molarDensity() / equation.reducingDensity();
    double y = constants.cutoffWaveNumber * length;
    double cvShare = state.cv() / state.cp();
    double omega = 2 / Math.PI * ((1 - cvShare) * Math.atan(y) + cvShare * y);
    double omega0 = 2 / Math.PI * -Math.expm1(-1 / (1 / y + y * y / (3 * delta * delta)));
    return state.molarDensity()
        * state.cp()
        * constants.amplitude
        * constants.boltzmann
        * state.temperature()
        * (omega - omega0)
        / (6 * Math.PI * viscosity.at(state) * length);
  }

  /** Correlation length, m; zero where there is no enhancement. */
  private double correlationLength(State state) {
    double reference = constants.referenceTemperature;
    double referenceSlope = equation.newPoint().moveTo(reference, state.molarDensity()).dpdRho();
    double susceptibility =
        constants.criticalPressure
            / (constants.criticalDensity * constants.criticalDensity)
            * state.molarDensity()
            * (1 / state.dpdRho() - reference / state.temperature() / referenceSlope);
    return susceptibility <= 0
        ? 0
        : constants.correlationLength
            * Math.pow(
                susceptibility / constants.fluctuationAmplitude, constants.nu / constants.gamma);
  }
}
