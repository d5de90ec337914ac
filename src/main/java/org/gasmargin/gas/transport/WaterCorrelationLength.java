package org.gasmargin.gas.transport;

import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.HelmholtzEquation;

/**
 * Correlation length of the density fluctuations of water, nm, as the IAPWS formulations for
 * viscosity and conductivity use it; zero where there is no critical enhancement.
 *
 * @param equation equation of state
 * @param reducingTemperature Tr, K
 * @param reducingDensity rhor, mol/m3
 * @param reducingPressure pr, Pa
 * @param referenceTemperature temperature without enhancement, in units of Tr
 * @param nu exponent of the length
 * @param gamma exponent of the compressibility
 * @param amplitude of the length, nm
 * @param fluctuationAmplitude of the compressibility
 */
public record WaterCorrelationLength(
    HelmholtzEquation equation,
    double reducingTemperature,
    double reducingDensity,
    double reducingPressure,
    double referenceTemperature,
    double nu,
    double gamma,
    double amplitude,
    double fluctuationAmplitude) {
  double at(State state) {
    double rho = state.molarDensity();
    double t = state.temperature() / reducingTemperature;
    double slopeThere =
        equation.newPoint().moveTo(referenceTemperature * reducingTemperature, rho).dpdRho();
    double scale = reducingPressure / reducingDensity;
    double excess =
        rho
            / reducingDensity
            * scale
            * (1 / state.dpdRho() - referenceTemperature / t / slopeThere);
    return excess <= 0 ? 0 : amplitude * Math.pow(excess / fluctuationAmplitude, nu / gamma);
  }
}
