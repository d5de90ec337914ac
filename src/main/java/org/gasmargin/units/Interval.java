package org.gasmargin.units;

/**
 * A nominal value with the lowest and highest value that its tolerance allows, in SI.
 *
 * @param low lowest value, finite, at most {@code nominal}
 * @param nominal the value itself, finite
 * @param high highest value, finite, at least {@code nominal}
 */
public record Interval(double low, double nominal, double high) {

  /** Refuses anything that is not finite or not ordered, so that a NaN cannot travel on. */
  public Interval {
    if (!Double.isFinite(low) || !Double.isFinite(nominal) || !Double.isFinite(high)) {
      throw new IllegalArgumentException("an interval needs finite numbers");
    }
    if (!(low <= nominal && nominal <= high)) {
      throw new IllegalArgumentException("an interval needs low <= nominal <= high");
    }
  }

  /** An interval without width at {@code value}. */
  public static Interval exactly(double value) {
    return new Interval(value, value, value);
  }

  /** The interval {@code nominal ± halfWidth}, with {@code halfWidth} at least zero. */
  public static Interval around(double nominal, double halfWidth) {
    return new Interval(nominal - halfWidth, nominal, nominal + halfWidth);
  }

  /**
   * The value at a position within the tolerance.
   *
   * @param position from -1, the lowest, over 0, the nominal, to 1, the highest
   */
  public double at(double position) {
    return position < 0
        ? nominal + position * (nominal - low)
        : nominal + position * (high - nominal);
  }

  /** Whether the tolerance is zero. */
  public boolean isExact() {
    return low == high;
  }
}
