package org.gasmargin.worksheet.plot;

import java.util.List;
import org.gasmargin.worksheet.layout.Stroke;

/**
 * A line in a plot.
 *
 * @param label letter at its end; empty for none
 * @param stroke how it looks
 * @param points in drawing order, in the units of the axes
 */
public record Curve(String label, Stroke stroke, List<Point> points) {
  /** Copies the points, leaving out those that are no numbers. */
  public Curve {
    points =
        points.stream()
            .filter(point -> Double.isFinite(point.x()) && Double.isFinite(point.y()))
            .toList();
  }

  /** A point in the units of the axes. */
  public record Point(double x, double y) {}
}
