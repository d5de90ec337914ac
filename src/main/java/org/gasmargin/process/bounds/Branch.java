package org.gasmargin.process.bounds;

import java.util.List;
import java.util.Optional;
import org.gasmargin.gas.State;

/**
 * One way through a step.
 *
 * @param states from the entry to the furthest end
 * @param ends states in which the step can end on this branch
 * @param words what happens on it, for people
 * @param failure why it was not followed to its end
 */
record Branch(List<State> states, List<State> ends, String words, Optional<String> failure) {

  Branch {
    states = List.copyOf(states);
    ends = List.copyOf(ends);
  }
}
