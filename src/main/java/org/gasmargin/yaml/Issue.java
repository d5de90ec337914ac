package org.gasmargin.yaml;

import java.util.Optional;
import org.gasmargin.units.Place;

/**
 * One thing in a file that its author can put right.
 *
 * @param place where it stands
 * @param problem what was read and why that is wrong, one line
 * @param hint what to write instead, one line, if there is something to offer
 */
public record Issue(Place place, String problem, Optional<String> hint) {

  /** Makes both texts fit for one line of a terminal, whatever the file holds. */
  public Issue {
    problem = Printable.line(problem);
    hint = hint.map(Printable::line);
  }

  /** The form {@code file:line:column: problem; hint}. */
  @Override
  public String toString() {
    return Printable.line(place.toString())
        + ": "
        + problem
        + hint.map(text -> "; " + text).orElse("");
  }
}
