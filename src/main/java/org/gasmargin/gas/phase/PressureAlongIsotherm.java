package org.gasmargin.gas.phase;

import org.gasmargin.gas.equation.BracketedNewton;
import org.gasmargin.gas.equation.EquationPoint;

/** Pressure less a target as a function of density, mol/m3, at one temperature. */
public final class PressureAlongIsotherm implements BracketedNewton.Rising {
  private final EquationPoint point;
  private final double temperature;
  private final double target;

  /**
   * @param point point that the search moves
   * @param temperature T, K
   * @param target pressure, Pa
   */
  public PressureAlongIsotherm(EquationPoint point, double temperature, double target) {
    this.point = point;
    this.temperature = temperature;
    this.target = target;
  }

  @Override
  public void moveTo(double density) {
    point.moveTo(temperature, density);
  }

  @Override
  public double excess() {
    return point.pressure() - target;
  }

  @Override
  public double slope() {
    return point.dpdRho();
  }
}
