package org.gasmargin.yaml;

import org.gasmargin.units.Place;

/**
 * Something in a file that its author can put right.
 *
 * @param place where it stands
 * @param problem what is wrong and what would be right, one line
 */
public record TextIssue(Place place, String problem) {

  /** The form {@code file:line:column: problem}. */
  @Override
  public String toString() {
    return place + ": " + problem;
  }
}
