package org.gasmargin.process.bounds;

import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.apache.commons.math3.exception.MaxCountExceededException;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.process.Closure;

/**
 * Balances of a path without heat exchange, checked by quadrature along it, apart from the algebra
 * that gave its states.
 */
final class PathClosure {
  private static final int MAX_EVALUATIONS = 20_000;

  private PathClosure() {}

  /**
   * Charging: the gain of internal energy is the enthalpy that came in, and the gain of amount is
   * what the flow brought.
   *
   * @param law the balance
   * @param start state before
   * @param end state after
   * @param flowed amount that flowed in, mol/m3
   */
  static Closure charging(PathLaw.Charging law, State start, State end, double flowed) {
    double gained = density(end, end.internalEnergy()) - density(start, start.internalEnergy());
    double supplied = (end.molarDensity() - start.molarDensity()) * law.supplyEnthalpy();
    return closure(
        end.molarDensity() - start.molarDensity() - flowed,
        largest(start.molarDensity(), end.molarDensity()),
        gained - supplied,
        largest(gained, supplied));
  }

  /**
   * Venting: the loss of internal energy is the enthalpy that left, integrated along the isentrope.
   *
   * @param gas the gas
   * @param start state before
   * @param end state after
   * @param flowed amount that flowed in, negative, mol/m3
   */
  static Closure venting(Gas gas, State start, State end, double flowed) {
    double gained = density(end, end.internalEnergy()) - density(start, start.internalEnergy());
    double left = alongIsentrope(gas, start, end, state -> state.enthalpy() * state.molarDensity());
    return closure(
        end.molarDensity() - start.molarDensity() - flowed,
        largest(start.molarDensity(), end.molarDensity()),
        gained - left,
        largest(gained, left));
  }

  /** Compression of a closed amount: the gain of internal energy is the work p dv put in. */
  static Closure compression(Gas gas, State start, State end) {
    double gained = end.internalEnergy() - start.internalEnergy();
    double work = alongIsentrope(gas, start, end, state -> state.pressure() / state.molarDensity());
    return closure(0, end.molarDensity(), gained - work, largest(gained, work));
  }

  /** Amount that a change of pressure brings along a law, by quadrature of drho/dp, mol/m3. */
  static double flowedByPressure(Gas gas, PathLaw law, State start, State end) {
    return integral(
        logPressure -> {
          double pressure = Math.exp(logPressure);
          return pressure * law.densityPerPressure(law.atPressure(gas, start, pressure));
        },
        Math.log(start.pressure()),
        Math.log(end.pressure()));
  }

  private interface Integrand {
    double of(State state);
  }

  /** Integral of f d(ln rho) along the isentrope of {@code start}. */
  private static double alongIsentrope(Gas gas, State start, State end, Integrand f) {
    return integral(
        logDensity -> f.of(gas.atDensityEntropy(Math.exp(logDensity), start.entropy())),
        Math.log(start.molarDensity()),
        Math.log(end.molarDensity()));
  }

  private static double integral(UnivariateFunction f, double from, double to) {
    if (from == to) {
      return 0;
    }
    try {
      double size =
          new IterativeLegendreGaussIntegrator(12, 1e-11, 1e-14, 2, 12)
              .integrate(MAX_EVALUATIONS, f, Math.min(from, to), Math.max(from, to));
      return from < to ? size : -size;
    } catch (MaxCountExceededException e) {
      throw new OutsideValidity("the balance of a path could not be checked by quadrature");
    }
  }

  private static double density(State state, double molar) {
    return state.molarDensity() * molar;
  }

  private static double largest(double a, double b) {
    return Math.max(Math.abs(a), Math.abs(b));
  }

  private static Closure closure(
      double amountGap, double amountScale, double energyGap, double energyScale) {
    return new Closure(
        Math.abs(amountGap) / amountScale,
        energyScale == 0 ? 0 : Math.abs(energyGap) / energyScale);
  }
}
