package org.gasmargin.gas.phase;

import org.gasmargin.gas.equation.BracketedNewton;
import org.gasmargin.gas.equation.EquationPoint;
import org.gasmargin.gas.equation.HelmholtzEquation;

/**
 * Guard of a mixture that is treated as one fluid: below the highest temperature at which it can
 * condense, only gas clearly below the dew pressure is accepted, and no liquid.
 */
public final class DewLine implements PhaseBoundary {
  /** Distance kept from the dew pressure, in stated errors of its correlation. */
  private static final double ERRORS_KEPT = 3;

  private final HelmholtzEquation equation;
  private final Ancillary dewPressure;
  private final Ancillary vapourDensity;

  /**
   * @param equation equation of state
   * @param dewPressure correlation of the dew pressure, Pa; its reducing temperature is the highest
   *     at which the mixture condenses
   * @param vapourDensity correlation of the dew density, mol/m3
   */
  public DewLine(HelmholtzEquation equation, Ancillary dewPressure, Ancillary vapourDensity) {
    this.equation = equation;
    this.dewPressure = dewPressure;
    this.vapourDensity = vapourDensity;
  }

  @Override
  public double gapCloses() {
    return dewPressure.reducingTemperature();
  }

  private double highestPressure(double temperature) {
    return dewPressure.at(temperature) * (1 - ERRORS_KEPT * dewPressure.maxError());
  }

  @Override
  public PhaseEnds endsAt(double temperature) {
    EquationPoint point = equation.newPoint();
    double pressure = highestPressure(temperature);
    double density =
        BracketedNewton.solve(
            new PressureAlongIsotherm(point, temperature, pressure),
            0,
            vapourDensity.at(temperature),
            pressure / (equation.gasConstant() * temperature));
    return new PhaseEnds(
        temperature, density, pressure, Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY);
  }

  @Override
  public boolean isStable(double temperature, double density, double pressure) {
    return density <= vapourDensity.at(temperature) && pressure <= highestPressure(temperature);
  }
}
