package org.gasmargin.worksheet.plot;

import java.util.Comparator;
import java.util.List;
import org.gasmargin.worksheet.layout.Canvas;
import org.gasmargin.worksheet.layout.Stroke;

/**
 * The letters at the ends of curves: right of the frame where a curve ends near it, above the frame
 * where it ends near the top, otherwise beside the end. Letters that would overlap move apart and a
 * thin line leads back to the curve.
 */
final class EndLabels {
  private static final float DISTANCE = 8.5f;
  private static final float HALF_HEIGHT = 2.7f;
  private static final double RIGHT_FROM = 0.72;
  private static final double ABOVE_FROM = 0.6;
  private static final Stroke LEADER = Stroke.solid(0.3f, 0.45f);

  private final Canvas canvas;
  private final Plot.Area area;
  private final Plot plot;

  EndLabels(Canvas canvas, Plot.Area area, Plot plot) {
    this.canvas = canvas;
    this.area = area;
    this.plot = plot;
  }

  private enum Side {
    RIGHT,
    ABOVE,
    BESIDE
  }

  /** Whether a letter stands above the frame, where the title of the axis would be. */
  static boolean anyAbove(Plot plot) {
    return plot.curves().stream().anyMatch(curve -> side(plot, curve) == Side.ABOVE);
  }

  void draw() {
    List<Curve> right = on(Side.RIGHT, Comparator.comparingDouble(this::endY));
    float[] y = apart(right.stream().map(this::endY).toList(), area.top() + 3, area.bottom());
    for (int i = 0; i < y.length; i++) {
      Curve curve = right.get(i);
      letter(curve, area.right() + 4, y[i] + HALF_HEIGHT);
      if (area.right() - endX(curve) > 4 || Math.abs(endY(curve) - y[i]) > 3) {
        canvas.line(endX(curve), endY(curve), area.right() + 3, y[i], LEADER);
      }
    }
    List<Curve> above = on(Side.ABOVE, Comparator.comparingDouble(this::endX));
    float[] x = apart(above.stream().map(this::endX).toList(), area.left() + 4, area.right());
    for (int i = 0; i < x.length; i++) {
      letter(above.get(i), x[i] - HALF_HEIGHT, area.top() - 4);
      canvas.line(endX(above.get(i)), endY(above.get(i)), x[i], area.top() - 3, LEADER);
    }
    for (Curve curve : on(Side.BESIDE, Comparator.comparingDouble(this::endX))) {
      letter(curve, endX(curve) + 3, Math.min(endY(curve) + HALF_HEIGHT, area.bottom() - 2));
    }
  }

  private void letter(Curve curve, float x, float baseline) {
    canvas.text(curve.label(), x, baseline, Plot.LABEL.strong());
  }

  private List<Curve> on(Side side, Comparator<Curve> order) {
    return plot.curves().stream()
        .filter(curve -> !curve.label().isEmpty() && side(plot, curve) == side)
        .sorted(order)
        .toList();
  }

  private static Side side(Plot plot, Curve curve) {
    if (curve.label().isEmpty()) {
      return Side.BESIDE;
    }
    if (plot.x().position(end(curve).x()) > RIGHT_FROM) {
      return Side.RIGHT;
    }
    return plot.y().position(end(curve).y()) > ABOVE_FROM ? Side.ABOVE : Side.BESIDE;
  }

  /** Positions in rising order, moved so that neighbours keep their distance within a range. */
  private static float[] apart(List<Float> wanted, float least, float most) {
    float[] places = new float[wanted.size()];
    for (int i = 0; i < places.length; i++) {
      float inside = Math.max(least, Math.min(most, wanted.get(i)));
      places[i] = i == 0 ? inside : Math.max(inside, places[i - 1] + DISTANCE);
    }
    for (int i = places.length - 1; i >= 0; i--) {
      places[i] = Math.min(places[i], most - (places.length - 1 - i) * DISTANCE);
    }
    return places;
  }

  private float endX(Curve curve) {
    return plot.along(area, end(curve).x());
  }

  private float endY(Curve curve) {
    return plot.across(area, end(curve).y());
  }

  private static Curve.Point end(Curve curve) {
    return curve.points().get(curve.points().size() - 1);
  }
}
