package org.gasmargin.units;

import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;

/** Finds the known name that a misspelled one was meant to be. */
public final class NearestName {
  private static final int LONGEST_COMPARED = 60;

  private NearestName() {}

  /**
   * The nearest known name, if it is near enough to be offered: at most two edits, or a third of
   * the typed word, away. Of equally near names the first in alphabetical order is given.
   */
  public static Optional<String> of(String typed, Collection<String> known) {
    if (typed.isEmpty() || typed.length() > LONGEST_COMPARED) {
      return Optional.empty();
    }
    int allowed = Math.min(typed.length() - 1, Math.max(2, typed.length() / 3));
    return known.stream()
        .sorted()
        .min(Comparator.comparingInt(name -> distance(typed, name)))
        .filter(name -> distance(typed, name) <= allowed);
  }

  /** Number of insertions, deletions, replacements and swaps of neighbours between two words. */
  static int distance(String left, String right) {
    int[][] edits = new int[left.length() + 1][right.length() + 1];
    for (int i = 0; i <= left.length(); i++) {
      for (int j = 0; j <= right.length(); j++) {
        edits[i][j] = i == 0 || j == 0 ? i + j : fewest(edits, left, right, i, j);
      }
    }
    return edits[left.length()][right.length()];
  }

  private static int fewest(int[][] edits, String left, String right, int i, int j) {
    int replace = left.charAt(i - 1) == right.charAt(j - 1) ? 0 : 1;
    int best =
        Math.min(edits[i - 1][j - 1] + replace, Math.min(edits[i - 1][j], edits[i][j - 1]) + 1);
    boolean swapped =
        i > 1
            && j > 1
            && left.charAt(i - 1) == right.charAt(j - 2)
            && left.charAt(i - 2) == right.charAt(j - 1);
    return swapped ? Math.min(best, edits[i - 2][j - 2] + 1) : best;
  }
}
