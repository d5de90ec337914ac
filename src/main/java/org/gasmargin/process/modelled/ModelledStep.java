package org.gasmargin.process.modelled;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Event;
import org.gasmargin.process.PathOutcome;

/**
 * The modelled path of one step.
 *
 * @param outcome the path, or why there is none
 * @param end what the vessel holds afterwards; empty if there is no path, and after the compression
 *     of trapped gas, which leaves other gas in the vessel
 * @param closure balances of the path, if there is one
 * @param events in rising time
 * @param notes in plain words
 * @param extrapolated whether the film inside was taken above the range of its correlation
 */
public record ModelledStep(
    PathOutcome outcome,
    Optional<VesselCondition> end,
    Optional<Closure> closure,
    List<Event> events,
    List<String> notes,
    boolean extrapolated) {

  /** Copies the lists. */
  public ModelledStep {
    events = List.copyOf(events);
    notes = List.copyOf(notes);
  }

  /** The same with one more note, if there is one. */
  ModelledStep withNote(Optional<String> note) {
    List<String> more = new ArrayList<>(notes);
    note.ifPresent(more::add);
    return new ModelledStep(outcome, end, closure, events, more, extrapolated);
  }

  /** A step without a path. */
  public static ModelledStep without(PathOutcome outcome) {
    return new ModelledStep(
        outcome, Optional.empty(), Optional.empty(), List.of(), List.of(), false);
  }
}
