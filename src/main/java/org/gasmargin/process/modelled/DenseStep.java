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
    double rest = 1 - share;
    double[] z = new double[startUnknowns.length];
    for (int i = 0; i < z.length; i++) {
      double straight = startUnknowns[i] * rest + endUnknowns[i] * share;
      double rise = endUnknowns[i] - startUnknowns[i];
      boolean bound = startSlopes[i] == 0 && endSlopes[i] == 0;
      double bend =
          bound
              ? 0
              : share
                  * rest
                  * (rest * (length * startSlopes[i] - rise)
                      - share * (length * endSlopes[i] - rise));
      z[i] = straight + bend;
    }
    return z;
  }
}
