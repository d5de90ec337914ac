package org.gasmargin.process.modelled;

import java.util.List;

/**
 * A solution over time.
 *
 * @param steps accepted steps, in order; empty if nothing had to be integrated
 * @param flows what has flowed from start to end
 * @param sightings changes of sign that were found, in order
 */
@SuppressWarnings("ArrayRecordComponent") // never compared, never handed out of the package
record Trajectory(List<DenseStep> steps, double[] flows, List<Sighting> sightings) {

  /**
   * A change of sign.
   *
   * @param watch index of the watch
   * @param time s
   */
  record Sighting(int watch, double time) {}

  /** Time of the end, s. */
  double end() {
    return steps.get(steps.size() - 1).end();
  }

  /** Unknowns at the end. */
  double[] endUnknowns() {
    return steps.get(steps.size() - 1).endUnknowns();
  }
}
