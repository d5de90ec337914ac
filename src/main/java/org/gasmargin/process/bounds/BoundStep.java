package org.gasmargin.process.bounds;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.StepResult;

/**
 * The bounds of one step.
 *
 * @param paths isothermal, adiabatic and unmixed
 * @param envelope extremes over all branches
 * @param closure balances of the adiabatic path, if they could be checked
 * @param amount least and most gas at the end, if known
 */
public record BoundStep(
    Map<PathKind, PathOutcome> paths,
    Envelope envelope,
    Optional<Closure> closure,
    Optional<StepResult.DensityRange> amount) {

  /** Copies the map. */
  public BoundStep {
    paths = Map.copyOf(paths);
  }

  /** An envelope of which nothing is known. */
  static Envelope unknownEnvelope(Surroundings surroundings, String reason) {
    return new Envelope(
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        surroundings.hottest(),
        surroundings.coldest(),
        List.of(reason));
  }
}
