package org.gasmargin.process;

import java.util.List;
import org.gasmargin.vessel.Vessel;

/**
 * All that the simulation needs of a job.
 *
 * @param site the surroundings
 * @param vessels at least one, names unique
 * @param steps in order, at least one, each naming one of the vessels
 */
public record Procedure(Site site, List<Vessel> vessels, List<Step> steps) {

  /** Copies the lists. */
  public Procedure {
    vessels = List.copyOf(vessels);
    steps = List.copyOf(steps);
  }

  /**
   * The vessel that a step acts on.
   *
   * @throws IllegalArgumentException if the step names none of the vessels
   */
  public Vessel vesselOf(Step step) {
    return vessels.stream()
        .filter(vessel -> vessel.name().equals(step.vessel()))
        .findFirst()
        .orElseThrow(() -> new IllegalArgumentException("no vessel " + step.vessel()));
  }
}
