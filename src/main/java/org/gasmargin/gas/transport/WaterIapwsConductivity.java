package org.gasmargin.gas.transport;

import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Thermal conductivity of water by the IAPWS formulation of 2011 with its critical enhancement.
 * Symbols are those of the release.
 *
 * @param molarMass kg/mol
 * @param reducingTemperature K
 * @param reducingMassDensity kg/m3
 * @param dilute rows a, i of sum a (Tr/T)^i
 * @param residual rows a, i, j of sum a (Tr/T - 1)^i (rho/rhor - 1)^j
 * @param length correlation length, nm
 * @param amplitude Lambda of the enhancement
 * @param cutoff q_D, 1/nm
 * @param massGasConstant J/(kg K)
 * @param leastY value of y below which there is no enhancement
 * @param viscosity viscosity of water
 */
public record WaterIapwsConductivity(
    double molarMass,
    double reducingTemperature,
    double reducingMassDensity,
    PowerSum dilute,
    PowerSum residual,
    WaterCorrelationLength length,
    double amplitude,
    double cutoff,
    double massGasConstant,
    double leastY,
    Viscosity viscosity)
    implements Conductivity {
  /** The formulation counts in mW/(m K). */
  private static final double WATT = 1e-3;

  @Override
  public double at(State state) {
    double t = reducingTemperature / state.temperature();
    double r = state.molarDensity() * molarMass / reducingMassDensity;
    double lambda0 = 1 / (Math.sqrt(t) * dilute.at(t));
    double lambda1 = Math.exp(r * residual.at(t - 1, r - 1));
    return WATT * (lambda0 * lambda1 + enhancement(state, t, r));
  }

  private double enhancement(State state, double t, double r) {
    double y = cutoff * length.at(state);
    if (y < leastY) {
      return 0;
    }
    double cvShare = state.cv() / state.cp();
    double damping = Math.expm1(-1 / (1 / y + y * y / (3 * r * r)));
    double z = 2 / (Math.PI * y) * ((1 - cvShare) * Math.atan(y) + cvShare * y + damping);
    double cp = state.cp() / molarMass / massGasConstant;
    return amplitude * r * cp * z / (t * 1e6 * viscosity.at(state));
  }
}
