package org.gasmargin.worksheet.plot;

import java.util.ArrayList;
import java.util.List;
import org.gasmargin.worksheet.layout.Canvas;
import org.gasmargin.worksheet.layout.Canvas.Anchor;
import org.gasmargin.worksheet.layout.Figure;
import org.gasmargin.worksheet.layout.Stroke;
import org.gasmargin.worksheet.layout.Style;

/**
 * Curves over two axes, told apart by dashes and by a letter at the end of each.
 *
 * @param x horizontal axis
 * @param y vertical axis
 * @param curves in drawing order
 * @param limits horizontal lines that are not to be crossed
 */
public record Plot(Axis x, Axis y, List<Curve> curves, List<LimitLine> limits)
    implements Figure.Drawing {
  private static final float ABOVE = 15;
  private static final float BELOW = 23;
  private static final float RIGHT = 12;
  private static final float RESOLUTION = 0.4f;
  static final Style LABEL = new Style(false, Style.SMALLEST, 0);
  private static final Stroke GRID = Stroke.solid(0.3f, 0.85f);
  private static final Stroke LIMIT = Stroke.dashed(1f, 7f, 1.5f, 1.5f, 1.5f);

  /** Copies the lists without curves that have no points. */
  public Plot {
    curves = curves.stream().filter(curve -> !curve.points().isEmpty()).toList();
    limits = List.copyOf(limits);
  }

  /**
   * A limit across the plot.
   *
   * @param value on the vertical axis
   * @param label what it is
   */
  public record LimitLine(double value, String label) {}

  /** The rectangle between the axes. */
  record Area(float left, float top, float width, float height) {
    float right() {
      return left + width;
    }

    float bottom() {
      return top + height;
    }
  }

  @Override
  public void draw(Canvas canvas, float left, float top, float width, float height) {
    float tickLabels = 0;
    for (Axis.Tick tick : y.ticks()) {
      tickLabels = Math.max(tickLabels, canvas.width(tick.label(), LABEL));
    }
    float beside = tickLabels + 5;
    Area area =
        new Area(left + beside, top + ABOVE, width - beside - RIGHT, height - ABOVE - BELOW);
    drawAxes(canvas, area, left);
    canvas.clipped(
        area.left(),
        area.top(),
        area.width(),
        area.height(),
        () -> {
          limits.forEach(limit -> drawLimit(canvas, area, limit));
          drawLimitLabels(canvas, area);
          curves.forEach(curve -> drawCurve(canvas, area, curve));
        });
    new EndLabels(canvas, area, this).draw();
  }

  private void drawAxes(Canvas canvas, Area area, float left) {
    for (Axis.Tick tick : y.ticks()) {
      float at = across(area, tick.value());
      canvas.line(area.left(), at, area.right(), at, GRID);
      canvas.text(tick.label(), area.left() - 3, at + 2.7f, LABEL, Anchor.RIGHT);
    }
    float free = Float.NEGATIVE_INFINITY;
    for (Axis.Tick tick : x.ticks()) {
      float at = along(area, tick.value());
      canvas.line(at, area.top(), at, area.bottom(), GRID);
      float half = canvas.width(tick.label(), LABEL) / 2;
      if (at - half > free) {
        canvas.text(tick.label(), at, area.bottom() + 9, LABEL, Anchor.CENTRE);
        free = at + half + 3;
      }
    }
    canvas.outline(area.left(), area.top(), area.width(), area.height(), Stroke.OUTLINE);
    if (EndLabels.anyAbove(this)) {
      canvas.text(y.title(), area.right(), area.top() - 6, LABEL.strong(), Anchor.RIGHT);
    } else {
      canvas.text(y.title(), left, area.top() - 6, LABEL.strong());
    }
    canvas.text(x.title(), area.right(), area.bottom() + 19, LABEL.strong(), Anchor.RIGHT);
  }

  private void drawLimit(Canvas canvas, Area area, LimitLine limit) {
    float at = across(area, limit.value());
    canvas.line(area.left(), at, area.right(), at, LIMIT);
  }

  /** Labels stand above their line, or below it near the top, at the side with more room. */
  private void drawLimitLabels(Canvas canvas, Area area) {
    for (LimitLine limit : limits) {
      float at = across(area, limit.value());
      float baseline = y.position(limit.value()) > 0.85 ? at + 8 : at - 2.5f;
      float labelWidth = canvas.width(limit.label(), LABEL);
      float left = area.left() + 3;
      float right = area.right() - 3 - labelWidth;
      float middle = baseline - 3;
      boolean onTheLeft =
          room(area, left, left + labelWidth, middle)
              >= room(area, right, right + labelWidth, middle);
      canvas.text(limit.label(), onTheLeft ? left : right, baseline, LABEL);
    }
  }

  /** How near the curves come to a height between two places, pt. */
  private float room(Area area, float from, float to, float height) {
    float least = area.height();
    for (Curve curve : curves) {
      for (int i = 1; i < curve.points().size(); i++) {
        float x1 = along(area, curve.points().get(i - 1).x());
        float x2 = along(area, curve.points().get(i).x());
        if (Math.max(x1, x2) >= from && Math.min(x1, x2) <= to) {
          float y1 = across(area, curve.points().get(i - 1).y()) - height;
          float y2 = across(area, curve.points().get(i).y()) - height;
          boolean crosses = y1 * y2 <= 0;
          least = crosses ? 0 : Math.min(least, Math.min(Math.abs(y1), Math.abs(y2)));
        }
      }
    }
    return least;
  }

  private void drawCurve(Canvas canvas, Area area, Curve curve) {
    List<Float> xs = new ArrayList<>();
    List<Float> ys = new ArrayList<>();
    int last = curve.points().size() - 1;
    for (int i = 0; i <= last; i++) {
      float px = along(area, curve.points().get(i).x());
      float py = across(area, curve.points().get(i).y());
      int before = xs.size() - 1;
      boolean visible =
          before < 0
              || Math.abs(px - xs.get(before)) > RESOLUTION
              || Math.abs(py - ys.get(before)) > RESOLUTION;
      if (visible || i == last) {
        xs.add(px);
        ys.add(py);
      }
    }
    if (xs.size() > 1) {
      canvas.polyline(array(xs), array(ys), curve.stroke());
    }
  }

  float along(Area area, double value) {
    return area.left() + (float) x.position(value) * area.width();
  }

  float across(Area area, double value) {
    return area.bottom() - (float) y.position(value) * area.height();
  }

  private static float[] array(List<Float> values) {
    float[] result = new float[values.size()];
    for (int i = 0; i < result.length; i++) {
      result[i] = values.get(i);
    }
    return result;
  }
}
