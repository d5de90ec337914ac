package org.gasmargin.process.modelled;

import java.util.List;
import org.gasmargin.process.Event;

/**
 * A part of a step that was integrated in one go.
 *
 * @param begin time since the start of the step, s
 * @param system what was integrated
 * @param trajectory its solution, from time zero
 * @param recorder its instants, from time zero
 * @param events in rising time since the start of the step
 * @param turned whether the turn that was watched for ended it
 */
record Phase(
    double begin,
    GasWallSystem system,
    Trajectory trajectory,
    PathRecorder recorder,
    List<Event> events,
    boolean turned) {

  /** Time since the start of the step at which it ended, s. */
  double end() {
    return begin + trajectory.end();
  }
}
