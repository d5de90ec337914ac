package org.gasmargin.process.bounds;

/**
 * How the surroundings may intervene on a branch: perfectly, whenever the gas would leave the
 * range. Any real exchange with surroundings of the floor temperature or colder leaves the gas no
 * hotter than the branch that is held at the floor; likewise for the ceiling.
 *
 * @param floor lowest gas temperature, K; zero for none
 * @param ceiling highest gas temperature, K; infinite for none
 */
record Exchange(double floor, double ceiling) {
  /** No heat passes. */
  static final Exchange NONE = new Exchange(0, Double.POSITIVE_INFINITY);

  /** The branch to the hottest gas among surroundings of at most this temperature, K. */
  static Exchange keepAbove(double surroundings) {
    return new Exchange(surroundings, Double.POSITIVE_INFINITY);
  }

  /** The branch to the coldest gas among surroundings of at least this temperature, K. */
  static Exchange keepBelow(double surroundings) {
    return new Exchange(0, surroundings);
  }

  /** The temperature, K, that gas of a temperature is brought to. */
  double held(double temperature) {
    return Math.min(Math.max(temperature, floor), ceiling);
  }
}
