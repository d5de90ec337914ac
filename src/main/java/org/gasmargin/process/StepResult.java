package org.gasmargin.process;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What was computed for one step.
 *
 * @param step the step
 * @param paths an outcome for every {@link PathKind}
 * @param envelope extremes on which rules judge
 * @param credited modelled extremes with the uncertainty of the correlation and the tolerances of
 *     the inputs set against the user; empty if there is no modelled path
 * @param closure balances; empty if nothing could be computed
 * @param settledAmount least and most gas that can be in the vessel at the end, mol/m3; empty if
 *     unknown
 * @param events in rising time
 * @param notes findings of the simulation itself, in plain words: why something is not assessed
 * @param modelledCheckFailure why the modelled path contradicts the bounds, if it does
 */
public record StepResult(
    Step step,
    Map<PathKind, PathOutcome> paths,
    Envelope envelope,
    Optional<Credited> credited,
    Optional<Closure> closure,
    Optional<DensityRange> settledAmount,
    List<Event> events,
    List<String> notes,
    Optional<String> modelledCheckFailure) {

  /** Copies the collections. */
  public StepResult {
    paths = Map.copyOf(paths);
    events = List.copyOf(events);
    notes = List.copyOf(notes);
  }

  /** The path of a kind, if it was computed. */
  public Optional<Path> path(PathKind kind) {
    return paths.get(kind) instanceof PathOutcome.Computed computed
        ? Optional.of(computed.path())
        : Optional.empty();
  }

  /**
   * Modelled extremes with uncertainty set against the user, K and Pa absolute.
   *
   * @param highestGasTemperature K
   * @param lowestGasTemperature K
   * @param highestPressure Pa
   * @param lowestPressure Pa
   * @param highestWallTemperature K
   * @param lowestWallTemperature K
   * @param allowance in words: what was varied and by how much
   */
  public record Credited(
      double highestGasTemperature,
      double lowestGasTemperature,
      double highestPressure,
      double lowestPressure,
      OptionalDouble highestWallTemperature,
      OptionalDouble lowestWallTemperature,
      String allowance) {}

  /**
   * Molar densities at the end of the step.
   *
   * @param least mol/m3
   * @param most mol/m3
   */
  public record DensityRange(double least, double most) {}
}
