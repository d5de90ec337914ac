package org.gasmargin.process.modelled;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Random;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.gasmargin.gas.OutsideValidity;
import org.junit.jupiter.api.Test;

/** The banded solver against the dense one of Commons Math. */
class BandMatrixTest {

  @Test
  void solutionIsThatOfADenseSolver() {
    Random random = new Random(7);
    for (int size = 1; size < 40; size++) {
      BandMatrix band = new BandMatrix(size);
      RealMatrix dense = new Array2DRowRealMatrix(size, size);
      double[] right = new double[size];
      for (int i = 0; i < size; i++) {
        right[i] = random.nextGaussian();
        for (int j = Math.max(0, i - 2); j <= Math.min(size - 1, i + 2); j++) {
          double entry = i == j ? 0.01 * random.nextGaussian() : random.nextGaussian();
          band.set(i, j, entry);
          dense.setEntry(i, j, entry);
        }
      }
      double[] expected =
          new LUDecomposition(dense).getSolver().solve(new ArrayRealVector(right)).toArray();
      band.factorise();
      band.solve(right);
      assertArrayEquals(expected, right, 1e-7 * new ArrayRealVector(expected).getNorm());
    }
  }

  @Test
  void singularMatrixIsRefused() {
    BandMatrix band = new BandMatrix(2);
    band.set(0, 0, 1);
    assertThrows(OutsideValidity.class, band::factorise);
  }

  @Test
  void entryThatIsNotANumberIsRefused() {
    BandMatrix band = new BandMatrix(1);
    band.set(0, 0, Double.NaN);
    assertThrows(OutsideValidity.class, band::factorise);
  }

  @Test
  void entryOutsideTheBandIsRefused() {
    assertThrows(IllegalArgumentException.class, () -> new BandMatrix(5).set(0, 3, 1));
  }
}
