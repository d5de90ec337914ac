package org.gasmargin.process.modelled;

import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.vessel.OutsideExchange;
import org.gasmargin.vessel.WallConduction;
import org.gasmargin.vessel.WallConduction.Conductance;
import org.gasmargin.vessel.WallConduction.Link;

/**
 * The wall cells and the outer surface within the unknowns of a {@link GasWallSystem}. Temperatures
 * of the wall are unknown as offsets from a datum near them: the heat between two thin cells is the
 * small difference of two temperatures, and offsets keep its digits.
 *
 * @param datum K
 * @param wall conduction
 * @param outside heat transfer to the surroundings
 */
record WallSide(double datum, WallConduction wall, OutsideExchange outside) {
  private static final int INNER_SURFACE = GasWallSystem.INNER_SURFACE;
  private static final int FIRST = GasWallSystem.FIRST_CELL;

  /** The same wall with another datum, K. */
  WallSide withDatum(double other) {
    return new WallSide(other, wall, outside);
  }

  private int last() {
    return FIRST + wall.cells() - 1;
  }

  /** Index of the outer surface, the last of the unknowns. */
  int outerSurface() {
    return last() + 1;
  }

  /** Heat from the inner surface into the first cell, W. */
  Link entering(double[] z) {
    Conductance inner = wall.innerSurface(datum + z[FIRST]);
    double drop = z[INNER_SURFACE] - z[FIRST];
    return new Link(inner.value() * drop, inner.value(), inner.slope() * drop - inner.value());
  }

  private Link leaving(int row, double[] z) {
    if (row < last()) {
      return wall.link(row - FIRST, datum, z[row], z[row + 1]);
    }
    Conductance outer = wall.outerSurface(datum + z[row]);
    double drop = z[row] - z[row + 1];
    return new Link(outer.value() * drop, outer.value() + outer.slope() * drop, -outer.value());
  }

  /** Heat to the surroundings, W: what the outer surface passes on. */
  double lost(double[] z) {
    return leaving(last(), z).heat();
  }

  /** Heat contents of the cells, J. */
  void conserved(double[] z, double[] y) {
    for (int i = 0; i < wall.cells(); i++) {
      y[FIRST + i] = wall.heatContent(i, datum, z[FIRST + i]);
    }
    y[outerSurface()] = 0;
  }

  /** Rows of an implicit stage. */
  void stage(double[] z, double[] known, double weight, double[] residual, BandMatrix m) {
    Link entering = entering(z);
    for (int row = FIRST; row <= last(); row++) {
      int cell = row - FIRST;
      Link leaving = leaving(row, z);
      residual[row] =
          wall.heatContent(cell, datum, z[row])
              - known[row]
              - weight * (entering.heat() - leaving.heat());
      m.set(row, row - 1, -weight * entering.byInner());
      m.set(
          row,
          row,
          wall.capacity(cell, datum + z[row]) - weight * (entering.byOuter() - leaving.byInner()));
      m.set(row, row + 1, weight * leaving.byOuter());
      entering = leaving;
    }
    int surface = outerSurface();
    OutsideExchange.Flux lost = outside.flux(datum + z[surface]);
    residual[surface] = entering.heat() - wall.outerArea() * lost.flux();
    m.set(surface, surface - 1, entering.byInner());
    m.set(surface, surface, entering.byOuter() - wall.outerArea() * lost.bySurface());
  }

  /** Rates of the heat contents, W. */
  void rates(double[] z, double[] rates) {
    double entering = entering(z).heat();
    for (int row = FIRST; row <= last(); row++) {
      double leaving = leaving(row, z).heat();
      rates[row] = entering - leaving;
      entering = leaving;
    }
    rates[outerSurface()] = 0;
  }

  /** Turns rates of the heat contents into rates of the temperatures. */
  void slopes(double[] z, double[] rates, double[] slopes) {
    for (int i = 0; i < wall.cells(); i++) {
      slopes[FIRST + i] = rates[FIRST + i] / wall.capacity(i, datum + z[FIRST + i]);
    }
    slopes[outerSurface()] = 0;
  }

  /** Finds the outer surface temperature at which the surface passes on what it gets. */
  void balanceOuterSurface(double[] z) {
    int surface = outerSurface();
    for (int iteration = 0; iteration < GasWallSystem.MOST_ITERATIONS; iteration++) {
      Link leaving = leaving(last(), z);
      OutsideExchange.Flux lost = outside.flux(datum + z[surface]);
      double excess = leaving.heat() - wall.outerArea() * lost.flux();
      double step = excess / (leaving.byOuter() - wall.outerArea() * lost.bySurface());
      z[surface] -= step;
      if (Math.abs(step) <= GasWallSystem.SURFACE_PRECISION * datum) {
        return;
      }
    }
    throw new OutsideValidity("the temperature of the outer surface did not converge");
  }
}
