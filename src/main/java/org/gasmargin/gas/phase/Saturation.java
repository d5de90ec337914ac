package org.gasmargin.gas.phase;

import java.util.Locale;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.equation.EquationPoint;
import org.gasmargin.gas.equation.HelmholtzEquation;

/**
 * Saturation of a pure fluid from its equation of state: liquid and vapour of equal pressure and
 * equal Gibbs energy, by Newton's method in the two densities.
 *
 * <p>Within 1e-4 of the critical temperature the two densities are no longer well determined in
 * double precision. There the gap is taken as wide as it is at the edge of that strip, so a few
 * stable states are refused and no unstable one is accepted.
 */
public final class Saturation implements PhaseBoundary {
  private static final double CRITICAL_STRIP = 1e-4;
  private static final int MAX_STEPS = 60;

  /** Last relative step of the iteration; it converges quadratically. */
  private static final double LAST_STEP = 1e-9;

  private final HelmholtzEquation equation;
  private final double criticalTemperature;
  private final double stripTemperature;
  private final Ancillary liquidDensity;
  private final Ancillary vapourDensity;
  private final double liquidMargin;
  private final double vapourMargin;

  /**
   * @param equation equation of state
   * @param criticalTemperature critical temperature of the equation itself, K
   * @param liquidDensity starting value of the liquid density, mol/m3
   * @param vapourDensity starting value of the vapour density, mol/m3
   */
  public Saturation(
      HelmholtzEquation equation,
      double criticalTemperature,
      Ancillary liquidDensity,
      Ancillary vapourDensity) {
    this.equation = equation;
    this.criticalTemperature = criticalTemperature;
    this.liquidDensity = liquidDensity;
    this.vapourDensity = vapourDensity;
    stripTemperature =
        Math.min(criticalTemperature, liquidDensity.reducingTemperature()) * (1 - CRITICAL_STRIP);
    liquidMargin = margin(liquidDensity);
    vapourMargin = margin(vapourDensity);
  }

  /** Share of the density beyond which the correlation alone settles the phase. */
  private static double margin(Ancillary density) {
    return 0.01 + 4 * density.maxError();
  }

  @Override
  public double gapCloses() {
    return criticalTemperature;
  }

  @Override
  public boolean isStable(double temperature, double density, double pressure) {
    double start = Math.min(temperature, stripTemperature);
    if (density < vapourDensity.at(start) * (1 - vapourMargin)
        || density > liquidDensity.at(start) * (1 + liquidMargin)) {
      return true;
    }
    PhaseEnds ends = endsAt(temperature);
    return density <= ends.vapourDensity() || density >= ends.liquidDensity();
  }

  @Override
  public PhaseEnds endsAt(double temperature) {
    PhaseEnds ends = coexistence(Math.min(temperature, stripTemperature));
    if (temperature <= stripTemperature) {
      return ends;
    }
    EquationPoint point = equation.newPoint();
    double vapour = ends.vapourDensity();
    double liquid = ends.liquidDensity();
    return new PhaseEnds(
        temperature,
        vapour,
        point.moveTo(temperature, vapour).pressure(),
        liquid,
        point.moveTo(temperature, liquid).pressure());
  }

  private PhaseEnds coexistence(double temperature) {
    EquationPoint liquid = equation.newPoint();
    EquationPoint vapour = equation.newPoint();
    double rt = equation.gasConstant() * temperature;
    double rhoL = liquidDensity.at(temperature);
    double rhoV = vapourDensity.at(temperature);
    for (int i = 0; i < MAX_STEPS; i++) {
      liquid.moveTo(temperature, rhoL);
      vapour.moveTo(temperature, rhoV);
      double pressureGap = vapour.pressure() - liquid.pressure();
      double gibbsGap = rt * (vapour.reducedGibbs() - liquid.reducedGibbs());
      double b = (gibbsGap - pressureGap / rhoL) / (1 / rhoL - 1 / rhoV);
      double stepL = (pressureGap + b) / liquid.dpdRho();
      double stepV = b / vapour.dpdRho();
      double size = Math.max(Math.abs(stepL / rhoL), Math.abs(stepV / rhoV));
      double damping = Math.min(1, 0.2 / size);
      rhoL += damping * stepL;
      rhoV += damping * stepV;
      if (size < LAST_STEP && rhoL > rhoV) {
        double pressure = vapour.moveTo(temperature, rhoV).pressure();
        return new PhaseEnds(temperature, rhoV, pressure, rhoL, pressure);
      }
    }
    throw new OutsideValidity(
        String.format(
            Locale.ROOT, "the saturation iteration did not converge at %.6g K", temperature));
  }
}
