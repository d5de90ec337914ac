package org.gasmargin.vessel;

import java.util.Arrays;

/**
 * Transient conduction through a layered wall by finite volumes, one-dimensional in the depth.
 *
 * <p>Each cell has one temperature, that of its middle, and stores the exact integral of its heat
 * capacity. Heat passes between the middles of neighbours through the two half cells in series, so
 * that layers meet in perfect contact and what leaves one cell enters the next to the last bit. The
 * surfaces are reached through a half cell. Second order in the cell size.
 */
public final class WallConduction {
  private final int cells;
  private final double innerArea;
  private final double outerArea;
  private final double thickness;
  private final double[] mass;
  private final double[] innerHalf;
  private final double[] outerHalf;
  private final PiecewiseLinear[] conductivity;
  private final PiecewiseLinear[] heatCapacity;

  /**
   * A wall on the standard grid.
   *
   * @param wall shape and layers
   * @param thicknesses thickness of each layer, m, above zero
   */
  public WallConduction(Wall wall, double[] thicknesses) {
    this(wall, thicknesses, 1);
  }

  /**
   * A wall on a finer grid.
   *
   * @param wall shape and layers
   * @param thicknesses thickness of each layer, m, above zero
   * @param refinement every cell of the standard grid is divided into so many
   */
  public WallConduction(Wall wall, double[] thicknesses, int refinement) {
    if (thicknesses.length != wall.layers().size()
        || !Arrays.stream(thicknesses).allMatch(t -> t > 0 && Double.isFinite(t))) {
      throw new IllegalArgumentException("every layer needs a thickness above zero");
    }
    WallGeometry geometry = new WallGeometry(wall.shape());
    WallGrid grid = new WallGrid(wall.layers(), thicknesses, refinement);
    cells = grid.cells();
    innerArea = geometry.area(0);
    thickness = grid.depth();
    outerArea = geometry.area(thickness);
    mass = new double[cells];
    innerHalf = new double[cells];
    outerHalf = new double[cells];
    conductivity = new PiecewiseLinear[cells];
    heatCapacity = new PiecewiseLinear[cells];
    for (int i = 0; i < cells; i++) {
      Material material = wall.layers().get(grid.layer(i)).material();
      mass[i] = material.density() * geometry.volume(grid.face(i), grid.face(i + 1));
      innerHalf[i] = geometry.resistance(grid.face(i), grid.middle(i));
      outerHalf[i] = geometry.resistance(grid.middle(i), grid.face(i + 1));
      conductivity[i] = material.conductivity();
      heatCapacity[i] = material.heatCapacity();
    }
  }

  /** Number of cells. */
  public int cells() {
    return cells;
  }

  /** Area of the inner surface, m2. */
  public double innerArea() {
    return innerArea;
  }

  /** Area of the outer surface, m2. */
  public double outerArea() {
    return outerArea;
  }

  /** Thickness of all layers, m. */
  public double thickness() {
    return thickness;
  }

  /** Heat capacity of a cell at a temperature, J/K. */
  public double capacity(int cell, double temperature) {
    return mass[cell] * heatCapacity[cell].at(temperature);
  }

  /**
   * Heat content of a cell above a datum, J.
   *
   * @param datum K
   * @param offset of the cell's temperature from the datum, K
   */
  public double heatContent(int cell, double datum, double offset) {
    return mass[cell] * heatCapacity[cell].integralOver(datum, offset);
  }

  /** Heat content of the wall above a uniform temperature, J. */
  public double heatContentAbove(double reference, double[] temperatures) {
    double sum = 0;
    for (int i = 0; i < cells; i++) {
      sum += heatContent(i, reference, temperatures[i] - reference);
    }
    return sum;
  }

  /** The uniform temperature with the same heat content, K. */
  public double meanTemperature(double[] temperatures) {
    double mean = Arrays.stream(temperatures).average().orElseThrow();
    for (int iteration = 0; iteration < 50; iteration++) {
      double capacity = 0;
      for (int i = 0; i < cells; i++) {
        capacity += capacity(i, mean);
      }
      double step = heatContentAbove(mean, temperatures) / capacity;
      mean += step;
      if (Math.abs(step) <= 1e-12 * mean) {
        break;
      }
    }
    return mean;
  }

  /** Conductance from the inner surface to the middle of the first cell. */
  public Conductance innerSurface(double firstCell) {
    return half(0, innerHalf[0], firstCell);
  }

  /** Conductance from the middle of the last cell to the outer surface. */
  public Conductance outerSurface(double lastCell) {
    return half(cells - 1, outerHalf[cells - 1], lastCell);
  }

  /**
   * Heat that passes from the middle of a cell to the middle of the next. Temperatures are given as
   * offsets from a datum, whose difference keeps more digits.
   *
   * @param cell the inner one of the two
   * @param datum K
   * @param inner offset of its temperature, K
   * @param outer offset of the temperature of the next, K
   */
  public Link link(int cell, double datum, double inner, double outer) {
    PiecewiseLinear kInner = conductivity[cell];
    PiecewiseLinear kOuter = conductivity[cell + 1];
    double resistanceInner = outerHalf[cell] / kInner.at(datum + inner);
    double resistanceOuter = innerHalf[cell + 1] / kOuter.at(datum + outer);
    double conductance = 1 / (resistanceInner + resistanceOuter);
    double heat = conductance * (inner - outer);
    double bendInner = resistanceInner * kInner.slopeAt(datum + inner) / kInner.at(datum + inner);
    double bendOuter = resistanceOuter * kOuter.slopeAt(datum + outer) / kOuter.at(datum + outer);
    return new Link(
        heat, conductance * (1 + heat * bendInner), conductance * (-1 + heat * bendOuter));
  }

  private Conductance half(int cell, double resistance, double temperature) {
    return new Conductance(
        conductivity[cell].at(temperature) / resistance,
        conductivity[cell].slopeAt(temperature) / resistance);
  }

  /**
   * A conductance that depends on the temperature of a cell.
   *
   * @param value W/K
   * @param slope its derivative by that temperature, W/K2
   */
  public record Conductance(double value, double slope) {}

  /**
   * Heat between two cells, outwards.
   *
   * @param heat W
   * @param byInner derivative by the inner temperature, W/K
   * @param byOuter derivative by the outer temperature, W/K
   */
  public record Link(double heat, double byInner, double byOuter) {}
}
