package org.gasmargin.worksheet.plot;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.gasmargin.worksheet.numbers.Digits;

/**
 * An axis with round ticks, linear or logarithmic.
 *
 * @param low value at the start of the axis
 * @param high value at its end, above {@code low}
 * @param logarithmic whether equal distances are equal ratios
 * @param title quantity and unit
 */
public record Axis(double low, double high, boolean logarithmic, String title) {
  private static final int WANTED_TICKS = 4;
  private static final double FLATTEST = 0.04;

  /** Refuses an axis without length. */
  public Axis {
    if (!(low < high) || !Double.isFinite(high - low) || (logarithmic && !(low > 0))) {
      throw new IllegalArgumentException("no axis from " + low + " to " + high);
    }
  }

  /**
   * A mark on the axis.
   *
   * @param value where
   * @param label what stands at it; may be empty
   */
  public record Tick(double value, String label) {}

  /**
   * A linear axis that shows all values between two, with a little room at both ends, and so long
   * that what hardly changes looks flat.
   */
  public static Axis linear(double least, double most, String title) {
    double scale = Math.max(Math.abs(least), Math.abs(most));
    double range = Math.max(most - least, Math.max(scale * FLATTEST, Double.MIN_NORMAL * 1e9));
    double middle = (least + most) / 2;
    return new Axis(middle - range * 0.56, middle + range * 0.56, false, title);
  }

  /** A linear axis that begins exactly at zero. */
  public static Axis fromZero(double most, String title) {
    return new Axis(0, most > 0 ? most * 1.02 : 1, false, title);
  }

  /** A logarithmic axis that shows all values between two above zero. */
  public static Axis logarithmic(double least, double most, String title) {
    double ratio = Math.max(Math.pow(most / least, 0.06), 1.02);
    return new Axis(least / ratio, most * ratio, true, title);
  }

  /** Where a value stands: 0 at the start of the axis, 1 at its end. */
  public double position(double value) {
    return logarithmic
        ? Math.log(value / low) / Math.log(high / low)
        : (value - low) / (high - low);
  }

  /** Round values along the axis, in rising order. */
  public List<Tick> ticks() {
    return logarithmic && high / low > 3 ? logarithmicTicks() : linearTicks();
  }

  private List<Tick> linearTicks() {
    double step = roundStep((high - low) / WANTED_TICKS);
    double largest = Math.max(Math.abs(low), Math.abs(high));
    int decimals = Math.max(0, (int) -Math.floor(Math.log10(step) + 1e-9));
    boolean powers = largest >= 1e6 || decimals > 4;
    List<Tick> ticks = new ArrayList<>();
    for (long i = (long) Math.ceil(low / step - 1e-9); i * step <= high + step * 1e-9; i++) {
      double value = i * step;
      String label = powers ? Digits.power(value) : plain(value, decimals);
      ticks.add(new Tick(value, label));
    }
    return ticks;
  }

  private List<Tick> logarithmicTicks() {
    boolean many = high / low > 2000;
    List<Tick> ticks = new ArrayList<>();
    for (int decade = (int) Math.floor(Math.log10(low)); Math.pow(10, decade) <= high; decade++) {
      for (int digit : new int[] {1, 2, 5}) {
        double value = digit * Math.pow(10, decade);
        if (value >= low && value <= high) {
          boolean labelled = digit == 1 || !many;
          ticks.add(new Tick(value, labelled ? logarithmicLabel(value, -decade) : ""));
        }
      }
    }
    return ticks;
  }

  private static String logarithmicLabel(double value, int decimals) {
    return value >= 1e6 || value < 1e-4 ? Digits.power(value) : plain(value, Math.max(0, decimals));
  }

  private static String plain(double value, int decimals) {
    return String.format(Locale.ROOT, "%." + decimals + "f", value + 0.0).replace('-', '−');
  }

  private static double roundStep(double rough) {
    double power = Math.pow(10, Math.floor(Math.log10(rough)));
    double mantissa = rough / power;
    return power * (mantissa <= 1 ? 1 : mantissa <= 2 ? 2 : mantissa <= 5 ? 5 : 10);
  }
}
