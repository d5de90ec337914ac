package org.gasmargin.job;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.process.Supply;
import org.gasmargin.units.Place;
import org.gasmargin.units.Quantity;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.yaml.Issues;

/**
 * Follows the pressure of each vessel from step to step as far as the job file alone tells it, to
 * catch a target on the wrong side of it.
 */
final class Pressures {
  private final Map<String, Known> known = new HashMap<>();
  private final Issues issues;

  Pressures(Issues issues) {
    this.issues = issues;
  }

  /**
   * @param pressure Pa absolute
   * @param words as it was typed
   */
  private record Known(double pressure, String words) {}

  /** Begins with the start pressure of a vessel. */
  void start(Vessel vessel) {
    known.put(vessel.name(), new Known(vessel.startPressure().nominal(), "start pressure"));
  }

  /** From here on the pressure depends on the calculation. */
  void forget(String vessel) {
    known.remove(vessel);
  }

  /** Adds an issue unless a target lies above the present pressure, as far as that is known. */
  void mustRise(String vessel, Quantity target, Place place) {
    move(vessel, target.si().nominal(), target.typed(), place, "above");
  }

  /** The same with the pressure of a supply as the target. */
  void mustRise(String vessel, Supply target, Place place) {
    move(vessel, target.pressure().nominal(), words(target), place, "above");
  }

  /** Adds an issue unless a target lies below the present pressure, as far as that is known. */
  void mustFall(String vessel, Quantity target, Place place) {
    move(vessel, target.si().nominal(), target.typed(), place, "below");
  }

  /** Adds an issue if a target lies above what a supply can give. */
  void mustNotExceed(Supply supply, Quantity target, Place place) {
    if (target.si().nominal() > supply.pressure().nominal()) {
      issues.add(
          place, target.typed() + " is above the " + words(supply) + ", which cannot give it");
    }
  }

  private static String words(Supply supply) {
    return "pressure of supply " + supply.name();
  }

  private void move(String vessel, double target, String words, Place place, String side) {
    Optional<Known> present = Optional.ofNullable(known.get(vessel));
    boolean right =
        present.isEmpty()
            || (side.equals("above")
                ? target > present.get().pressure()
                : target < present.get().pressure());
    if (!right) {
      issues.add(
          place,
          words
              + " is not "
              + side
              + " the "
              + present.get().words()
              + " of "
              + vessel
              + " before this step");
    }
    known.put(vessel, new Known(target, words));
  }
}
