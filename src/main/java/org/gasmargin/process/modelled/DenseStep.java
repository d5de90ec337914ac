package org.gasmargin.process.modelled;

/**
 * One accepted step with the cubic of Hermite between its ends; unknowns that are set by algebraic
 * equations run straight until they are made consistent.
 *
 * @param start s
 * @param end s, above {@code start}
 * @param startUnknowns unknowns at the start
 * @param endUnknowns unknowns at the end
 * @param startSlopes dz/dt at the start
 * @param endSlopes dz/dt at the end
 */
@SuppressWarnings("ArrayRecordComponent") // never compared, never handed out of the package
record DenseStep(
    double start,
    double end,
    double[] startUnknowns,
    double[] endUnknowns,
    double[] startSlopes,
    double[] endSlopes) {

  /** Unknowns at a time within the step. */
  double[] at(double time) {
    double length = end - start;
    double share = (time - start) / length;
    double[] z = new double[startUnknowns.length];
    for (int i = 0; i < z.length; i++) {
      boolean bound = startSlopes[i] == 0 && endSlopes[i] == 0;
      z[i] =
          bound
              ? startUnknowns[i] * (1 - share) + endUnknowns[i] * share
              : cubic(
                  length, share, startUnknowns[i], endUnknowns[i], startSlopes[i], endSlopes[i]);
    }
    return z;
  }

  /**
   * The cubic of Hermite.
   *
   * @param length of the step, s
   * @param share of the step that has passed
   * @param from value at the start
   * @param to value at the end
   * @param startSlope slope at the start, per s
   * @param endSlope slope at the end, per s
   */
  static double cubic(
      double length, double share, double from, double to, double startSlope, double endSlope) {
    double rest = 1 - share;
    double rise = to - from;
    double bend = rest * (length * startSlope - rise) - share * (length * endSlope - rise);
    return from * rest + to * share + share * rest * bend;
  }
}
