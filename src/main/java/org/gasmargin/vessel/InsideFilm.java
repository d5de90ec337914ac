package org.gasmargin.vessel;

import org.gasmargin.units.Interval;

/** How heat passes from the gas to the inner surface. */
public sealed interface InsideFilm {

  /**
   * A coefficient that the user measured or was given.
   *
   * @param coefficient W/(m2 K)
   */
  record Given(Interval coefficient) implements InsideFilm {}

  /** The published correlations for jet and natural convection. */
  record Correlation() implements InsideFilm {}
}
