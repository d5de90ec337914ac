package org.gasmargin.job;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.gasmargin.units.Place;

/** Collects what is wrong with one file while it is read. */
final class Issues {
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

  /** The errors in the order of the file. */
  JobErrors errors() {
    return new JobErrors(
        found.stream()
            .sorted(
                Comparator.comparingInt((Issue issue) -> issue.place().line())
                    .thenComparingInt(issue -> issue.place().column()))
            .distinct()
            .toList());
  }
}
