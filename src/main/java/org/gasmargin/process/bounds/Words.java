package org.gasmargin.process.bounds;

import java.util.Locale;

/** Numbers in the words of a path. */
final class Words {
  private static final double ICE_POINT = 273.15;

  private Words() {}

  /** A temperature, given in K, in degrees Celsius to a tenth, without a needless zero. */
  static String temperature(double kelvin) {
    String text = String.format(Locale.ROOT, "%.1f", kelvin - ICE_POINT);
    if (text.endsWith(".0")) {
      text = text.substring(0, text.length() - 2);
    }
    return ("-0".equals(text) ? "0" : text) + " degC";
  }

  /** A pressure, given in Pa absolute, in bar. */
  static String pressure(double pascal) {
    return String.format(Locale.ROOT, "%.3g bar(a)", pascal / 1e5);
  }
}
