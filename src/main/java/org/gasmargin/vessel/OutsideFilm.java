package org.gasmargin.vessel;

import org.gasmargin.units.Interval;

/** How heat passes from the outer surface to the surroundings. */
public sealed interface OutsideFilm {

  /**
   * A coefficient that the user measured or was given.
   *
   * @param coefficient W/(m2 K)
   */
  record Given(Interval coefficient) implements OutsideFilm {}

  /** Natural convection in air and radiation. */
  record StillAir() implements OutsideFilm {}

  /**
   * Cross flow of air and radiation.
   *
   * @param speed m/s
   */
  record Wind(double speed) implements OutsideFilm {}

  /** Natural convection in a still water bath at ambient temperature. */
  record WaterBath() implements OutsideFilm {}

  /** No heat passes. */
  record Insulated() implements OutsideFilm {}
}
