package org.gasmargin.worksheet.numbers;

/** Chooses a unit of time by length. */
public final class Durations {
  private static final double LONGEST_IN_SECONDS = 600;
  private static final double LONGEST_IN_MINUTES = 3 * 3600;

  private Durations() {}

  /** The scale in which a duration reads well. */
  public static Scale scaleFor(double seconds) {
    if (seconds < 1) {
      return new Scale(1e3, 0, "ms");
    }
    if (seconds <= LONGEST_IN_SECONDS) {
      return new Scale(1, 0, "s");
    }
    return seconds <= LONGEST_IN_MINUTES
        ? new Scale(1.0 / 60, 0, "min")
        : new Scale(1.0 / 3600, 0, "h");
  }

  /** The duration with its unit, without needless zeros. */
  public static String text(double seconds) {
    Scale scale = scaleFor(seconds);
    return scale.text(seconds);
  }
}
