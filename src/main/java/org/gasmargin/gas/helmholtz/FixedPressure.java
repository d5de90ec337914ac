package org.gasmargin.gas.helmholtz;

import org.gasmargin.gas.equation.BracketedNewton;
import org.gasmargin.gas.equation.EquationPoint;

/** A property less a target as a function of temperature, K, at one pressure. */
final class FixedPressure implements BracketedNewton.Rising {
  /** Properties that rise with temperature at constant pressure. */
  enum Property {
    ENTROPY,
    ENTHALPY
  }

  private final EquationPoint point;
  private final DensitySearch densities;
  private final double pressure;
  private final Property property;
  private final double target;

  FixedPressure(
      EquationPoint point,
      DensitySearch densities,
      double pressure,
      Property property,
      double target) {
    this.point = point;
    this.densities = densities;
    this.pressure = pressure;
    this.property = property;
    this.target = target;
  }

  @Override
  public void moveTo(double temperature) {
    densities.move(point, temperature, pressure);
  }

  @Override
  public double excess() {
    return switch (property) {
      case ENTROPY -> point.entropy() - target;
      case ENTHALPY -> point.enthalpy() - target;
    };
  }

  @Override
  public double slope() {
    return switch (property) {
      case ENTROPY -> point.cp() / point.temperature();
      case ENTHALPY -> point.cp();
    };
  }

  /**
   * One Newton step in the logarithms of temperature and density together, towards the pressure and
   * the target, from where the point stands now. Exact for an ideal gas with constant heat
   * capacity.
   *
   * @return the larger of the two relative steps, or NaN where the equation gives no direction
   */
  double stepBoth() {
    double t = point.temperature();
    double rho = point.density();
    double p = point.pressure();
    if (!(p > 0)) {
      return Double.NaN;
    }
    double pT = t * point.dpdT() / p;
    double pRho = rho * point.dpdRho() / p;
    double xT;
    double xRho;
    if (property == Property.ENTROPY) {
      xT = point.cv();
      xRho = -point.dpdT() / rho;
    } else {
      xT = t * (point.cv() + point.dpdT() / rho);
      xRho = point.dpdRho() - t * point.dpdT() / rho;
    }
    double pGap = Math.log(pressure / p);
    double xGap = -excess();
    double determinant = pT * xRho - pRho * xT;
    double stepT = (pGap * xRho - pRho * xGap) / determinant;
    double stepRho = (pT * xGap - pGap * xT) / determinant;
    double size = Math.max(Math.abs(stepT), Math.abs(stepRho));
    double damping = Math.min(1, 0.7 / size);
    point.moveTo(t * Math.exp(damping * stepT), rho * Math.exp(damping * stepRho));
    return size;
  }
}
