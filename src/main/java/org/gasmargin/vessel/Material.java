package org.gasmargin.vessel;

import java.util.List;

/**
 * A wall material. Properties are piecewise linear in temperature and constant beyond the ends of
 * the table; one point means constant.
 *
 * @param name name as in the job file, or "user material"
 * @param density kg/m3
 * @param points property points in rising temperature, at least one
 * @param source where the figures come from, with their status
 */
public record Material(String name, double density, List<Point> points, String source) {

  /** Copies the list. */
  public Material {
    points = List.copyOf(points);
  }

  /**
   * Properties at one temperature.
   *
   * @param temperature K
   * @param conductivity W/(m K)
   * @param heatCapacity J/(kg K)
   */
  public record Point(double temperature, double conductivity, double heatCapacity) {}
}
