package org.gasmargin.process.modelled;

/**
 * Something to be found during the integration: a change of sign.
 *
 * @param value the function whose sign changes
 * @param precision how near zero it must come at the instant that is found; zero for a function
 *     that jumps
 * @param ends whether the integration ends there
 */
record Watch(Value value, double precision, boolean ends) {

  /** A function of time and unknowns. */
  @FunctionalInterface
  interface Value {
    /** Its value. */
    double at(double time, double[] z);
  }
}
