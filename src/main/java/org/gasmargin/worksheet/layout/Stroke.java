package org.gasmargin.worksheet.layout;

import java.util.List;

/**
 * How a line is drawn.
 *
 * @param width pt
 * @param gray 0 black to 1 white
 * @param dashes lengths of dashes and gaps, pt; empty for a solid line
 */
public record Stroke(float width, float gray, List<Float> dashes) {
  /** Thin line between rows. */
  public static final Stroke HAIRLINE = solid(0.4f, 0.6f);

  /** Outline of boxes and axes. */
  public static final Stroke OUTLINE = solid(0.7f, 0);

  /** Copies the list. */
  public Stroke {
    dashes = List.copyOf(dashes);
  }

  /** A solid line. */
  public static Stroke solid(float width, float gray) {
    return new Stroke(width, gray, List.of());
  }

  /** A dashed black line. */
  public static Stroke dashed(float width, Float... dashes) {
    return new Stroke(width, 0, List.of(dashes));
  }
}
