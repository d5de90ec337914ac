package org.gasmargin.worksheet.numbers;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;

/** Writes numbers with as many digits as a reader can use. */
public final class Digits {
  private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";
  private static final String UNKNOWN = "–";
  private static final int SIGNIFICANT = 4;
  private static final int MOST_DECIMALS = 6;
  private static final double LARGE = 1e7;
  private static final double SMALL = 1e-4;

  private Digits() {}

  /** The number of decimals that shows the largest of some values with four digits. */
  public static int decimalsFor(double... values) {
    double largest = 0;
    for (double value : values) {
      largest = Math.max(largest, Math.abs(value));
    }
    if (!(largest > 0 && Double.isFinite(largest))) {
      return 1;
    }
    double rounded = new BigDecimal(largest).round(new MathContext(SIGNIFICANT)).doubleValue();
    int before = (int) Math.floor(Math.log10(rounded)) + 1;
    return Math.max(0, Math.min(MOST_DECIMALS, SIGNIFICANT - before));
  }

  /** The value with four digits. */
  public static String of(double value) {
    return of(value, decimalsFor(value));
  }

  /** The value with at most four digits after its first, without needless zeros. */
  public static String trimmed(double value) {
    String text = of(value, Math.min(MOST_DECIMALS, decimalsFor(value) + 1));
    if (text.indexOf('.') < 0 || text.indexOf('×') >= 0) {
      return text;
    }
    return text.replaceAll("0+$", "").replaceAll("\\.$", "");
  }

  /** The fewest decimals, at most those of four digits, that show all values exactly. */
  public static int fewestDecimals(double... values) {
    int most = decimalsFor(values);
    for (int decimals = 0; decimals < most; decimals++) {
      double unit = Math.pow(10, decimals);
      boolean exact = true;
      for (double value : values) {
        exact &= Math.abs(value * unit - Math.rint(value * unit)) < 1e-6;
      }
      if (exact) {
        return decimals;
      }
    }
    return most;
  }

  /**
   * The value with a number of decimals, or as a power of ten if it is so large or so small that
   * the decimals would not show it.
   */
  public static String of(double value, int decimals) {
    if (!Double.isFinite(value)) {
      return UNKNOWN;
    }
    double size = Math.abs(value);
    if (size >= LARGE || (size > 0 && size < SMALL)) {
      return power(value);
    }
    return plain(value, decimals);
  }

  /** The value with a number of decimals, never as a power of ten. */
  public static String plain(double value, int decimals) {
    String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
    boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
    return zero ? text.replace("-", "") : text.replace('-', '−');
  }

  /** The value as a number between 1 and 10 times a power of ten. */
  public static String power(double value) {
    if (value == 0) {
      return "0";
    }
    if (!Double.isFinite(value)) {
      return UNKNOWN;
    }
    String[] parts = String.format(Locale.ROOT, "%.3e", value).split("e", 2);
    StringBuilder exponent = new StringBuilder();
    int number = Integer.parseInt(parts[1]);
    for (char c : Integer.toString(Math.abs(number)).toCharArray()) {
      exponent.append(SUPERSCRIPTS.charAt(c - '0'));
    }
    return parts[0].replace('-', '−') + "×10" + (number < 0 ? "⁻" : "") + exponent;
  }
}
