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
}
