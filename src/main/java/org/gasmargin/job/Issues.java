package org.gasmargin.job;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.gasmargin.units.Place;

/** Collects what is wrong with one file while it is read. */
final class Issues {
  private static final int MOST_TOLD = 100;

  private final List<Issue> found = new ArrayList<>();

  void add(Place place, String problem) {
    found.add(new Issue(place, problem, Optional.empty()));
  }

  void add(Place place, String problem, String hint) {
    found.add(new Issue(place, problem, Optional.of(hint).filter(text -> !text.isEmpty())));
  }

  boolean isEmpty() {
    return found.isEmpty();
  }

  /** The errors in the order of the file; of very many, the first and how many more there are. */
  JobErrors errors() {
    List<Issue> sorted =
        found.stream()
            .sorted(Comparator.comparing(Issue::place, PlaceOrder.IN_FILE))
            .distinct()
            .toList();
    if (sorted.size() <= MOST_TOLD) {
      return new JobErrors(sorted);
    }
    List<Issue> told = new ArrayList<>(sorted.subList(0, MOST_TOLD));
    Place next = sorted.get(MOST_TOLD).place();
    int untold = sorted.size() - MOST_TOLD;
    told.add(new Issue(next, "and " + untold + " more errors from here on", Optional.empty()));
    return new JobErrors(told);
  }
}
