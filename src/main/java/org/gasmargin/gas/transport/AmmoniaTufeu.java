package org.gasmargin.gas.transport;

import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;

/**
 * Enhancement of the conductivity of ammonia around its critical point, W/(m K), after Tufeu and
 * others. It grows without bound at the critical temperature itself.
 *
 * @param molarMass kg/mol
 * @param criticalTemperature K
 * @param criticalMassDensity kg/m3
 * @param amplitude Lambda
 * @param nu exponent of the correlation length
 * @param gamma exponent of the compressibility
 * @param correctionExponent exponent Delta of the correction to scaling
 * @param correlationLength zeta0, m
 * @param correctionAmplitude amplitude of the correction to scaling
 * @param fluctuationAmplitude Gamma0
 * @param boltzmann J/K
 */
public record AmmoniaTufeu(
    double molarMass,
    double criticalTemperature,
    double criticalMassDensity,
    double amplitude,
    double nu,
    double gamma,
    double correctionExponent,
    double correlationLength,
    double correctionAmplitude,
    double fluctuationAmplitude,
    double boltzmann)
    implements ToDoubleFunction<State> {
  /** Below this share of the critical density another decay holds. */
  private static final double THIN = 0.6;

  @Override
  public double applyAsDouble(State state) {
    double t = Math.abs(state.temperature() / criticalTemperature - 1);
    double density = state.molarDensity() * molarMass;
    double critical = onCriticalIsochore(state.temperature(), t);
    double width = 0.61 * criticalMassDensity + 16.5 * Math.log(t);
    double width2 = width * width;
    if (density >= THIN * criticalMassDensity) {
      double away = density - 0.96 * criticalMassDensity;
      return critical * width2 / (width2 + away * away);
    }
    double away = (0.96 - THIN) * criticalMassDensity;
    double share = density / (THIN * criticalMassDensity);
    return critical * width2 / (width2 + away * away) * share * share;
  }

  private double onCriticalIsochore(double temperature, double t) {
    double viscosity = (2.6 + 1.6 * t) * 1e-5;
    double pressureSlope = (2.18 - 0.12 * Math.exp(-17.8 * t)) * 1e5;
    double correction = correctionAmplitude * Math.pow(t, correctionExponent);
    return amplitude
        * boltzmann
        * temperature
        * temperature
        * pressureSlope
        * pressureSlope
        * fluctuationAmplitude
        * Math.pow(t, -gamma)
        * (1 + correction / 0.7)
        * Math.exp(-36 * t * t)
        / (6 * Math.PI * viscosity * correlationLength * Math.pow(t, -nu) * (1 + correction));
  }
}
