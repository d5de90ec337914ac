package org.gasmargin.gas.equation;

/** A sum of powers, term by term from the rows of a table. Immutable. */
public final class PowerSum {
  private final double[][] rows;

  /**
   * @param rows one row a term: n, t for one variable; n, d, t for two; n, d, t, gamma, l where an
   *     exponential damps the term
   */
  public PowerSum(double[][] rows) {
    this.rows = new double[rows.length][];
    for (int i = 0; i < rows.length; i++) {
      this.rows[i] = rows[i].clone();
    }
  }

  /** Sum of n x^t over rows n, t. */
  public double at(double x) {
    double sum = 0;
    for (double[] row : rows) {
      sum += row[0] * Math.pow(x, row[1]);
    }
    return sum;
  }

  /** Derivative of {@link #at(double)}. */
  public double slope(double x) {
    double sum = 0;
    for (double[] row : rows) {
      sum += row[0] * row[1] * Math.pow(x, row[1] - 1);
    }
    return sum;
  }

  /** Sum of n x^d y^t over rows n, d, t. */
  public double at(double x, double y) {
    double sum = 0;
    for (double[] row : rows) {
      sum += row[0] * Math.pow(x, row[1]) * Math.pow(y, row[2]);
    }
    return sum;
  }

  /** Sum of n x^d y^t exp(-gamma x^l) over rows n, d, t, gamma, l. */
  public double damped(double x, double y) {
    double sum = 0;
    for (double[] row : rows) {
      double f = row[0] * Math.pow(x, row[1]) * Math.pow(y, row[2]);
      sum += row[3] == 0 ? f : f * Math.exp(-row[3] * Math.pow(x, row[4]));
    }
    return sum;
  }
}
