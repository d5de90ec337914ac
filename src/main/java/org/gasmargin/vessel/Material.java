package org.gasmargin.vessel;

import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * A wall material. Properties are piecewise linear in temperature and constant beyond the ends of
 * the table; one point means constant.
 *
 * @param name name as in the job file, or "user material"
 * @param density kg/m3, above zero
 * @param points property points in rising temperature, at least one
 * @param source where the figures come from, with their status
 */
public record Material(String name, double density, List<Point> points, String source) {

  /** Copies the list; refuses an empty table, falling temperatures and numbers not above zero. */
  public Material {
    points = List.copyOf(points);
    if (points.isEmpty() || !isPositive(density)) {
      throw new IllegalArgumentException("a material needs a density and at least one point");
    }
    double before = 0;
    for (Point point : points) {
      if (!(point.temperature() > before)) {
        throw new IllegalArgumentException("temperatures of a material must rise from above 0 K");
      }
      before = point.temperature();
    }
  }

  /**
   * Properties at one temperature.
   *
   * @param temperature K
   * @param conductivity W/(m K), above zero
   * @param heatCapacity J/(kg K), above zero
   */
  public record Point(double temperature, double conductivity, double heatCapacity) {

    /** Refuses numbers that are not above zero. */
    public Point {
      if (!isPositive(temperature) || !isPositive(conductivity) || !isPositive(heatCapacity)) {
        throw new IllegalArgumentException("properties of a material must be above zero");
      }
    }
  }

  /** Conductivity, W/(m K), as a function of temperature. */
  PiecewiseLinear conductivity() {
    return table(Point::conductivity);
  }

  /** Heat capacity, J/(kg K), as a function of temperature. */
  PiecewiseLinear heatCapacity() {
    return table(Point::heatCapacity);
  }

  private PiecewiseLinear table(ToDoubleFunction<Point> property) {
    return new PiecewiseLinear(
        points.stream().mapToDouble(Point::temperature).toArray(),
        points.stream().mapToDouble(property).toArray());
  }

  private static boolean isPositive(double value) {
    return value > 0 && Double.isFinite(value);
  }
}
