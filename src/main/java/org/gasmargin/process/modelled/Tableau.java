package org.gasmargin.process.modelled;

/**
 * Coefficients of an implicit Runge-Kutta method of third order with four stages, of which the
 * first is explicit and the others share one diagonal coefficient; L-stable, stiffly accurate,
 * stages of second order. The embedded weights are of second order.
 *
 * <p>The form follows Kennedy and Carpenter, Applied Numerical Mathematics 44 (2003) 139-181,
 * implicit part of ARK3(2)4L[2]SA. The coefficients are computed from the order conditions; only
 * the free embedded weights are numbers of that paper.
 */
final class Tableau {
  /** Root of x^3 - 3 x^2 + 3/2 x - 1/6 = 0 that makes the method L-stable. */
  static final double DIAGONAL = 0.435866521508459;

  static final int STAGES = 4;

  private static final double SECOND = 2 * DIAGONAL;
  private static final double THIRD = 0.6;

  private static final double[] NODES = {0, SECOND, THIRD, 1};
  private static final double[][] STAGE_WEIGHTS = stageWeights();
  private static final double[] EMBEDDED = {
    2756255671327.0 / 12835298489170.0,
    -10771552573575.0 / 22201958757719.0,
    9247589265047.0 / 10645013368117.0,
    2193209047091.0 / 5459859503100.0
  };

  private Tableau() {}

  /** Time of a stage as a share of the step. */
  static double node(int stage) {
    return NODES[stage];
  }

  /** Weight of an earlier stage's rate in a stage; of the last stage, in the result. */
  static double weight(int stage, int earlier) {
    return STAGE_WEIGHTS[stage][earlier];
  }

  /** Weight of a stage's rate in the embedded result. */
  static double embedded(int stage) {
    return EMBEDDED[stage];
  }

  private static double[][] stageWeights() {
    double a32 = THIRD * (THIRD - SECOND) / (4 * DIAGONAL);
    double half = 0.5 - DIAGONAL;
    double third = 1.0 / 3 - DIAGONAL;
    double b3 = (third - SECOND * half) / (THIRD * (THIRD - SECOND));
    double b2 = (half - b3 * THIRD) / SECOND;
    return new double[][] {
      {0, 0, 0, 0},
      {DIAGONAL, DIAGONAL, 0, 0},
      {THIRD - a32 - DIAGONAL, a32, DIAGONAL, 0},
      {1 - b2 - b3 - DIAGONAL, b2, b3, DIAGONAL}
    };
  }
}
