package org.gasmargin.process.modelled;

import org.gasmargin.flow.FlowResult;
import org.gasmargin.flow.Orifice;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.State;

/**
 * Flow out of a vessel through an orifice to the atmosphere, with the slopes that Newton's method
 * needs. The flow is that of the real gas; the slopes are those of the ideal form at the real
 * isentropic exponent, which costs one evaluation of the flow instead of three.
 */
final class OrificeVent implements Opening.Law {
  /**
   * Overpressure, relative to the atmosphere, below which the flow runs straight through zero, so
   * that the end of a vent has a finite slope.
   */
  static final double NEARLY_EMPTY = 1e-6;

  private final Gas gas;
  private final Orifice hole;
  private final double atmosphere;

  OrificeVent(Gas gas, Orifice hole, double atmosphere) {
    this.gas = gas;
    this.hole = hole;
    this.atmosphere = atmosphere;
  }

  @Override
  public Opening.Rate rate(State inside) {
    double pressure = inside.pressure();
    double over = pressure / atmosphere - 1;
    if (over < NEARLY_EMPTY) {
      return nearlyEmpty(inside, over);
    }
    FlowResult flow = hole.through(gas, inside, atmosphere);
    double byPressure = 0.5;
    if (!flow.choked()) {
      double k = inside.isentropicExponent();
      double low = Math.pow(atmosphere / pressure, 2 / k);
      double high = Math.pow(atmosphere / pressure, (k + 1) / k);
      byPressure -= (2 / k * low - (k + 1) / k * high) / (2 * (low - high));
    }
    double rate = -flow.massFlow() / gas.molarMass();
    return new Opening.Rate(
        rate,
        rate * (0.5 / inside.molarDensity() + byPressure * inside.dpdRho() / pressure),
        rate * byPressure * inside.dpdT() / pressure);
  }

  /** Whether the flow is choked. */
  boolean choked(State inside) {
    return hole.through(gas, inside, atmosphere).choked();
  }

  /** The flow of an incompressible fluid, which the real flow joins as the pressures meet. */
  private Opening.Rate nearlyEmpty(State inside, double over) {
    double massDensity = inside.molarDensity() * gas.molarMass();
    double velocity = Math.sqrt(2 * NEARLY_EMPTY * atmosphere / massDensity);
    double slope =
        -hole.dischargeCoefficient()
            * hole.area()
            * inside.molarDensity()
            * velocity
            / NEARLY_EMPTY;
    return new Opening.Rate(
        slope * over,
        slope * (inside.dpdRho() / atmosphere + 0.5 * over / inside.molarDensity()),
        slope * inside.dpdT() / atmosphere);
  }
}
