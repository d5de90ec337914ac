package org.gasmargin.worksheet.plot;

import org.gasmargin.worksheet.layout.Canvas;
import org.gasmargin.worksheet.layout.Figure;
import org.gasmargin.worksheet.layout.Stroke;

/**
 * A bar from a reference towards a limit. The limit stands at the same place in every bar, so that
 * bars below each other can be compared. The part up to the predicted value is grey, the part
 * beyond the limit black, the zone of the required margin hatched.
 *
 * @param reached how far the predicted value is on the way from reference (0) to limit (1)
 * @param zoneFrom where the zone of the required margin begins, at most 1
 */
public record MarginBar(double reached, double zoneFrom) implements Figure.Drawing {
  /** Height of a bar, pt. */
  public static final float HEIGHT = 10;

  private static final double FARTHEST = 1.35;
  private static final double NEAREST = -0.08;

  /**
   * A bar from numbers in one unit.
   *
   * @param reference start of the bar
   * @param predicted the tick
   * @param limit the line
   * @param margin positive inside the limit, negative beyond
   * @param required the zone before the limit, zero or above
   */
  public static MarginBar of(
      double reference, double predicted, double limit, double margin, double required) {
    double direction = direction(reference, predicted, limit, margin);
    double span = (limit - reference) * direction;
    double least = Math.max(Math.abs(margin), required) * 1.5;
    double length = span > 1e-3 * Math.max(Math.abs(limit), 1e-9) ? span : Math.max(least, 1e-9);
    return new MarginBar(1 - margin / length, Math.max(0, 1 - required / length));
  }

  /** 1 for a limit that is not to be passed upwards, -1 downwards. */
  private static double direction(double reference, double predicted, double limit, double margin) {
    if (predicted != limit && margin != 0) {
      return Math.signum(limit - predicted) * Math.signum(margin);
    }
    return limit >= reference ? 1 : -1;
  }

  @Override
  public void draw(Canvas canvas, float x, float top, float width, float height) {
    float barTop = top + 2.5f;
    float bar = height - 5;
    float at = place(x, width, reached);
    float start = place(x, width, 0);
    float limit = place(x, width, 1);
    float zone = place(x, width, zoneFrom);
    canvas.fill(start, barTop, limit - start, bar, 0.94f);
    canvas.fill(start, barTop, Math.max(0, Math.min(at, limit) - start), bar, 0.62f);
    if (limit - zone > 0.5f) {
      canvas.hatch(zone, barTop, limit - zone, bar, 2.2f, Stroke.solid(0.45f, 0));
    }
    if (at > limit) {
      canvas.fill(limit, barTop, at - limit, bar, 0);
    }
    canvas.outline(start, barTop, limit - start, bar, Stroke.solid(0.4f, 0));
    canvas.line(limit, top, limit, top + height, Stroke.solid(1.4f, 0));
    drawTick(canvas, at, top);
    if (reached > FARTHEST || reached < NEAREST) {
      float tip = reached > FARTHEST ? at + 4 : at - 4;
      float middle = barTop + bar / 2;
      canvas.polygon(new float[] {at, tip, at}, new float[] {barTop, middle, barTop + bar}, 0);
    }
  }

  private static void drawTick(Canvas canvas, float at, float top) {
    canvas.polygon(new float[] {at - 2.4f, at + 2.4f, at}, new float[] {top, top, top + 4}, 0);
  }

  private static float place(float x, float width, double part) {
    double clamped = Math.max(NEAREST, Math.min(FARTHEST, part));
    double room = FARTHEST - NEAREST;
    return x + 5 + (float) ((clamped - NEAREST) / room) * (width - 10);
  }
}
