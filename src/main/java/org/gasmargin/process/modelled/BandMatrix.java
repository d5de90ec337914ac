package org.gasmargin.process.modelled;

import java.util.Arrays;
import org.gasmargin.gas.OutsideValidity;

/**
 * A square matrix with {@value #BELOW} diagonals below the main one and {@value #ABOVE} above, with
 * its factors by Gaussian elimination and partial pivoting.
 */
final class BandMatrix {
  /** Diagonals below the main one. */
  static final int BELOW = 2;

  /** Diagonals above the main one. */
  static final int ABOVE = 2;

  private static final int REACH = BELOW + ABOVE;

  private final int size;
  private final double[][] rows;
  private final int[] pivots;

  BandMatrix(int size) {
    this.size = size;
    this.rows = new double[size][BELOW + REACH + 1];
    this.pivots = new int[size];
  }

  /** Sets every entry to zero. */
  void clear() {
    for (double[] row : rows) {
      Arrays.fill(row, 0);
    }
  }

  /** Sets one entry within the band. */
  void set(int row, int column, double value) {
    if (column < row - BELOW || column > row + ABOVE) {
      throw new IllegalArgumentException("entry outside the band");
    }
    rows[row][column - row + BELOW] = value;
  }

  /**
   * Replaces the matrix by its factors.
   *
   * @throws OutsideValidity if it is singular or not finite
   */
  void factorise() {
    for (int column = 0; column < size; column++) {
      int last = Math.min(size - 1, column + BELOW);
      int pivot = column;
      for (int row = column + 1; row <= last; row++) {
        if (Math.abs(entry(row, column)) > Math.abs(entry(pivot, column))) {
          pivot = row;
        }
      }
      pivots[column] = pivot;
      double head = entry(pivot, column);
      if (!(Math.abs(head) > 0 && Double.isFinite(head))) {
        throw new OutsideValidity("the equations of gas and wall have no single solution");
      }
      int reach = Math.min(size - 1, column + REACH);
      if (pivot != column) {
        swap(pivot, column, column, reach);
      }
      for (int row = column + 1; row <= last; row++) {
        double factor = entry(row, column) / head;
        put(row, column, factor);
        for (int k = column + 1; k <= reach; k++) {
          put(row, k, entry(row, k) - factor * entry(column, k));
        }
      }
    }
  }

  /** Replaces a right-hand side by the solution; the matrix must have been factorised. */
  void solve(double[] x) {
    for (int column = 0; column < size; column++) {
      double head = x[pivots[column]];
      x[pivots[column]] = x[column];
      x[column] = head;
      for (int row = column + 1; row <= Math.min(size - 1, column + BELOW); row++) {
        x[row] -= entry(row, column) * head;
      }
    }
    for (int row = size - 1; row >= 0; row--) {
      double sum = x[row];
      for (int k = row + 1; k <= Math.min(size - 1, row + REACH); k++) {
        sum -= entry(row, k) * x[k];
      }
      x[row] = sum / entry(row, row);
    }
  }

  private void swap(int one, int other, int from, int to) {
    for (int k = from; k <= to; k++) {
      double kept = entry(one, k);
      put(one, k, entry(other, k));
      put(other, k, kept);
    }
  }

  private double entry(int row, int column) {
    return rows[row][column - row + BELOW];
  }

  private void put(int row, int column, double value) {
    rows[row][column - row + BELOW] = value;
  }
}
