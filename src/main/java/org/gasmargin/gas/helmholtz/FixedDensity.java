package org.gasmargin.gas.helmholtz;

import org.gasmargin.gas.equation.BracketedNewton;
import org.gasmargin.gas.equation.EquationPoint;

/** A property less a target as a function of temperature, K, at one density. */
final class FixedDensity implements BracketedNewton.Rising {
  /** Properties that rise with temperature at constant density. */
  enum Property {
    ENERGY,
    PRESSURE,
    ENTROPY
  }

  private final EquationPoint point;
  private final double density;
  private final Property property;
  private final double target;

  FixedDensity(EquationPoint point, double density, Property property, double target) {
    this.point = point;
    this.density = density;
    this.property = property;
    this.target = target;
  }

  @Override
  public void moveTo(double temperature) {
    point.moveTo(temperature, density);
  }

  @Override
  public double excess() {
    return switch (property) {
      case ENERGY -> point.internalEnergy() - target;
      case PRESSURE -> point.pressure() - target;
      case ENTROPY -> point.entropy() - target;
    };
  }

  @Override
  public double slope() {
    return switch (property) {
      case ENERGY -> point.cv();
      case PRESSURE -> point.dpdT();
      case ENTROPY -> point.cv() / point.temperature();
    };
  }
}
