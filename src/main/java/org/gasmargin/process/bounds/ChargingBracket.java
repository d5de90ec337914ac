package org.gasmargin.process.bounds;

import java.util.Locale;
import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;
import org.apache.commons.math3.exception.NoBracketingException;
import org.apache.commons.math3.exception.TooManyEvaluationsException;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;

/** Solves the charging balance at a pressure by bracketing the temperature. */
final class ChargingBracket {
  private ChargingBracket() {}

  /**
   * The state at {@code pressure} with the same rho (u - h) as {@code from}.
   *
   * @throws OutsideValidity if no temperature within the range of the equation satisfies it
   */
  static State solve(Gas gas, PathLaw.Charging law, State from, double pressure) {
    double low = Math.max(gas.validity().minTemperature(), 0.5 * from.temperature());
    double high = gas.validity().maxTemperature();
    double excess = law.excess(from);
    try {
      double temperature =
          new BracketingNthOrderBrentSolver(1e-14, 1e-12, 5)
              .solve(
                  200, t -> law.excess(gas.atTemperaturePressure(t, pressure)) - excess, low, high);
      return gas.atTemperaturePressure(temperature, pressure);
    } catch (NoBracketingException | TooManyEvaluationsException e) {
      throw new OutsideValidity(
          String.format(
              Locale.ROOT,
              "filling %s without heat loss to %.4g Pa(a) leads outside %.1f K to %.1f K",
              gas.id(),
              pressure,
              low,
              high));
    }
  }
}
