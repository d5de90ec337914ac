package org.gasmargin.yaml;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.gasmargin.units.Place;

/** Collects what is wrong with files while they are read. */
public final class Issues {
  private static final int MOST_TOLD = 100;

  private final List<Issue> found = new ArrayList<>();

  /** Adds what is wrong. */
  public void add(Place place, String problem) {
    found.add(new Issue(place, problem, Optional.empty()));
  }

  /** Adds what is wrong and what would be right; an empty hint is none. */
  public void add(Place place, String problem, String hint) {
    found.add(new Issue(place, problem, Optional.of(hint).filter(text -> !text.isEmpty())));
  }

  /** Whether nothing is wrong. */
  public boolean isEmpty() {
    return found.isEmpty();
  }

  /** How many there are, to see whether a part brought new ones. */
  public int count() {
    return found.size();
  }

  /** All in the order of the files; of very many, the first and how many more there are. */
  public List<Issue> sorted() {
    List<Issue> sorted =
        found.stream()
            .sorted(Comparator.comparing(Issue::place, PlaceOrder.IN_FILE))
            .distinct()
            .toList();
    if (sorted.size() <= MOST_TOLD) {
      return sorted;
    }
    List<Issue> told = new ArrayList<>(sorted.subList(0, MOST_TOLD));
    Place next = sorted.get(MOST_TOLD).place();
    int untold = sorted.size() - MOST_TOLD;
    told.add(new Issue(next, "and " + untold + " more errors from here on", Optional.empty()));
    return told;
  }
}
