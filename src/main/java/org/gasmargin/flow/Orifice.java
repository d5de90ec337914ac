package org.gasmargin.flow;

import java.util.Locale;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;

/**
 * A hole between a vessel and a lower pressure. The gas expands on the isentrope of the upstream
 * state to the throat, with the real equation of state; the discharge coefficient multiplies the
 * flow. The approach velocity is neglected.
 *
 * <p>Valid for single-phase flow at the throat. The critical throat is where the velocity from the
 * enthalpy drop equals the local speed of sound, which is the largest mass flux on the isentrope
 * (textbook gas dynamics; checked against real-gas critical-flow values in the tests).
 *
 * @param diameter bore, m, above zero
 * @param dischargeCoefficient above zero, at most 1
 */
public record Orifice(double diameter, double dischargeCoefficient) {
  private static final int MAX_STEPS = 40;

  /** Refuses a hole without size. */
  public Orifice {
    if (!(diameter > 0) || !(dischargeCoefficient > 0 && dischargeCoefficient <= 1)) {
      throw new IllegalArgumentException("an orifice needs a diameter and a coefficient in (0, 1]");
    }
  }

  /** Geometric flow area, m2. */
  public double area() {
    return Math.PI / 4 * diameter * diameter;
  }

  /**
   * Flow from a stagnant gas.
   *
   * @param gas the gas
   * @param upstream stagnation state
   * @param backPressure pressure behind the hole, Pa absolute; at or above the upstream pressure
   *     the flow is zero
   * @throws OutsideValidity if the throat would condense or leave the range of the equation
   */
  public FlowResult through(Gas gas, State upstream, double backPressure) {
    if (!(backPressure < upstream.pressure())) {
      return new FlowResult(0, false, upstream.pressure());
    }
    State critical = criticalThroat(gas, upstream);
    boolean choked = critical.pressure() >= backPressure;
    State throat = choked ? critical : gas.atPressureEntropy(backPressure, upstream.entropy());
    double velocity =
        choked
            ? critical.speedOfSound()
            : Math.sqrt(2 * Math.max(0, upstream.enthalpy() - throat.enthalpy()) / gas.molarMass());
    double massFlow =
        dischargeCoefficient * area() * throat.molarDensity() * gas.molarMass() * velocity;
    return new FlowResult(massFlow, choked, throat.pressure());
  }

  /**
   * The state on the isentrope at which the gas moves at its own speed of sound, by secant steps in
   * the logarithm of density from the throat of an ideal gas with the same isentropic exponent.
   *
   * @throws OutsideValidity if there is none within the range of the equation
   */
  static State criticalThroat(Gas gas, State upstream) {
    double k = Math.max(upstream.isentropicExponent(), 1.05);
    double previous = Math.log(2 / (k + 1)) / (k - 1);
    double machExcess = machExcess(gas, upstream, previous);
    double current = 1.02 * previous;
    for (int i = 0; i < MAX_STEPS; i++) {
      State throat = onIsentrope(gas, upstream, current);
      double excess = machExcess(gas, upstream, throat);
      double slope = (excess - machExcess) / (current - previous);
      double next = current - excess / slope;
      if (!(next < 0.5 * current && next > 2 * current)) {
        break;
      }
      if (Math.abs(next - current) < 1e-11 * Math.abs(current) || excess == 0) {
        return throat;
      }
      previous = current;
      machExcess = excess;
      current = next;
    }
    throw new OutsideValidity(
        String.format(
            Locale.ROOT,
            "no critical throat found for %s at %.1f K and %.4g Pa(a)",
            gas.id(),
            upstream.temperature(),
            upstream.pressure()));
  }

  private static State onIsentrope(Gas gas, State upstream, double logDensityRatio) {
    return gas.atDensityEntropy(
        upstream.molarDensity() * Math.exp(logDensityRatio), upstream.entropy());
  }

  private static double machExcess(Gas gas, State upstream, double logDensityRatio) {
    return machExcess(gas, upstream, onIsentrope(gas, upstream, logDensityRatio));
  }

  /** Square of the Mach number on the isentrope, less one. */
  private static double machExcess(Gas gas, State upstream, State throat) {
    double w = throat.speedOfSound();
    return 2 * (upstream.enthalpy() - throat.enthalpy()) / gas.molarMass() / (w * w) - 1;
  }
}
