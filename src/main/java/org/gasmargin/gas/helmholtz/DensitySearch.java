package org.gasmargin.gas.helmholtz;

import org.gasmargin.gas.equation.BracketedNewton;
import org.gasmargin.gas.equation.EquationPoint;
import org.gasmargin.gas.equation.HelmholtzEquation;
import org.gasmargin.gas.phase.PhaseBoundary;
import org.gasmargin.gas.phase.PhaseEnds;
import org.gasmargin.gas.phase.PressureAlongIsotherm;

/**
 * Density of the stable phase at a temperature and pressure. On the stable side the pressure rises
 * with density all the way to the highest density of the range, so each bracket holds one root.
 */
final class DensitySearch {
  private final HelmholtzEquation equation;
  private final FluidLimits limits;

  DensitySearch(HelmholtzEquation equation, FluidLimits limits) {
    this.equation = equation;
    this.limits = limits;
  }

  /** Moves the point to the density at T, K, and p, Pa. */
  void move(EquationPoint point, double temperature, double pressure) {
    PhaseBoundary phases = limits.phases();
    if (temperature >= phases.gapCloses()) {
      double covolume = 1 / limits.maxDensity();
      double guess = pressure / (equation.gasConstant() * temperature + pressure * covolume);
      solve(point, temperature, pressure, 0, limits.maxDensity(), guess);
      return;
    }
    PhaseEnds ends = phases.endsAt(temperature);
    if (pressure <= ends.vapourPressure()) {
      double guess = pressure / (equation.gasConstant() * temperature);
      solve(point, temperature, pressure, 0, ends.vapourDensity(), guess);
    } else if (pressure >= ends.liquidPressure()) {
      double guess = ends.liquidDensity();
      solve(point, temperature, pressure, guess, limits.maxDensity(), guess);
    } else {
      throw limits.insideGap(temperature);
    }
  }

  private static void solve(
      EquationPoint point,
      double temperature,
      double pressure,
      double low,
      double high,
      double guess) {
    PressureAlongIsotherm isotherm = new PressureAlongIsotherm(point, temperature, pressure);
    point.moveTo(temperature, BracketedNewton.solve(isotherm, low, high, guess));
  }
}
