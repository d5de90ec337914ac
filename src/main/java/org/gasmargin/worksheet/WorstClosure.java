package org.gasmargin.worksheet;

import java.util.Optional;
import org.gasmargin.process.Closure;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.process.StepResult;

/** The balances of a whole procedure. */
final class WorstClosure {
  private WorstClosure() {}

  /**
   * The largest residuals, without sign, over all steps; not a number if a residual is none; empty
   * if a step has no closure, for then the worst is not known.
   */
  static Optional<Closure> of(ProcedureResult result) {
    double mass = 0;
    double energy = 0;
    for (StepResult step : result.steps()) {
      if (step.closure().isEmpty()) {
        return Optional.empty();
      }
      mass = Math.max(mass, Math.abs(step.closure().get().massRelative()));
      energy = Math.max(energy, Math.abs(step.closure().get().energyRelative()));
    }
    return result.steps().isEmpty() ? Optional.empty() : Optional.of(new Closure(mass, energy));
  }
}
