package org.gasmargin.worksheet.handcheck;

import java.math.BigDecimal;
import java.math.RoundingMode;
import org.gasmargin.worksheet.numbers.Digits;

/**
 * A number as it is printed. Later lines of a hand check go on with it, not with the number that it
 * was rounded from, so that a pocket calculator follows.
 *
 * @param value the printed number
 * @param decimals as printed
 */
public record Rounded(double value, int decimals) {
  /** Rounds to a number of decimals. */
  public static Rounded to(double exact, int decimals) {
    double value = new BigDecimal(exact).setScale(decimals, RoundingMode.HALF_UP).doubleValue();
    return new Rounded(value, decimals);
  }

  /** Rounds to a number of significant digits. */
  public static Rounded significant(double exact, int digits) {
    int before = exact == 0 ? 1 : (int) Math.floor(Math.log10(Math.abs(exact))) + 1;
    return to(exact, Math.max(0, digits - before));
  }

  @Override
  public String toString() {
    return Digits.plain(value, decimals);
  }
}
