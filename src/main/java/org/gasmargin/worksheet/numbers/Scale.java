package org.gasmargin.worksheet.numbers;

import java.math.BigDecimal;
import java.math.MathContext;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;

/**
 * From SI to the unit on the page: {@code shown = slope * si + offset}.
 *
 * @param slope shown unit per SI unit
 * @param offset in the shown unit
 * @param symbol of the shown unit, as printed
 */
public record Scale(double slope, double offset, String symbol) {
  private static final char NO_BREAK = '\u00a0';

  /** Lengths in millimetres. */
  public static final Scale MILLIMETRES = new Scale(1000, 0, "mm");

  /** The scale of a dimension in the units that the user typed, SI where there are none. */
  public static Scale of(Dimension dimension, DisplayUnits units) {
    return switch (dimension) {
      case PRESSURE_RATE -> pressureRate(units);
      default -> plain(dimension, units);
    };
  }

  /** The scale of differences between values of a dimension. */
  public static Scale ofDifference(Dimension dimension, DisplayUnits units) {
    return of(dimension.difference(), units);
  }

  /** Number and unit without needless zeros. */
  public String text(double si) {
    return Digits.trimmed(shown(si)) + NO_BREAK + symbol;
  }

  /** The value on the page. */
  public double shown(double si) {
    return slope * si + offset;
  }

  /** The value in SI of a number on the page. */
  public double toSi(double shown) {
    return (shown - offset) / slope;
  }

  /** Number and unit with a number of decimals. */
  public String text(double si, int decimals) {
    return Digits.of(shown(si), decimals) + NO_BREAK + symbol;
  }

  /** The symbol of a unit as it is printed, for example {@code °C} for {@code degC}. */
  public static String printed(String symbol) {
    return symbol
        .replace("degC", "°C")
        .replace("degF", "°F")
        .replaceAll("\\b(k?m|cm|mm|in|ft)2\\b", "$1²")
        .replaceAll("\\b(k?m|cm|mm|in|ft)3\\b", "$1³");
  }

  private static Scale plain(Dimension dimension, DisplayUnits units) {
    double offset = units.number(0, dimension);
    double step = dimension == Dimension.ABSOLUTE_PRESSURE ? 1e5 : 1;
    double slope = (units.number(step, dimension) - offset) / step;
    return new Scale(clean(slope), clean(offset), printed(units.symbol(dimension)));
  }

  /** Without the noise of the last digits. */
  private static double clean(double value) {
    return new BigDecimal(value).round(new MathContext(12)).doubleValue();
  }

  /** The rate of a pressure follows the unit of the pressure unless it has one of its own. */
  private static Scale pressureRate(DisplayUnits units) {
    boolean own = units.units().containsKey(Dimension.PRESSURE_RATE);
    if (own || !units.units().containsKey(Dimension.PRESSURE_DIFFERENCE)) {
      return plain(Dimension.PRESSURE_RATE, units);
    }
    Scale differences = plain(Dimension.PRESSURE_DIFFERENCE, units);
    return new Scale(differences.slope(), 0, differences.symbol() + "/s");
  }
}
