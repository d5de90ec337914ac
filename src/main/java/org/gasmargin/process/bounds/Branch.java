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
 * @param adiabatic whether no heat passes on it once the gas has settled
 * @param failure why it was not followed to its end
 */
record Branch(
    List<State> states,
    List<State> ends,
    String words,
    boolean adiabatic,
    Optional<String> failure) {

  Branch {
    states = List.copyOf(states);
    ends = List.copyOf(ends);
  }

  /** Where the stretch begins that leads to one of the states, if a closed form can follow it. */
  Optional<State> stretchStart(int index) {
    boolean settles = states.size() > 1 && sameDensity(states.get(0), states.get(1));
    if (index == 0) {
      return Optional.empty();
    }
    if (settles && index == 1) {
      return Optional.of(states.get(0));
    }
    return adiabatic ? Optional.of(states.get(settles ? 1 : 0)) : Optional.empty();
  }

  private static boolean sameDensity(State first, State second) {
    return first.molarDensity() == second.molarDensity();
  }
}
