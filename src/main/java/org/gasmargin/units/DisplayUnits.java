package org.gasmargin.units;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;

/**
 * The units in which results are shown: those that the user typed. Differences of pressure and
 * temperature, and rates of pressure, follow the unit of the points unless they have one of their
 * own.
 *
 * @param units one unit for each dimension that is not shown in SI
 * @param atmosphere atmospheric pressure, Pa absolute, for gauge units
 */
public record DisplayUnits(Map<Dimension, Unit> units, double atmosphere) {
  private static final int SIGNIFICANT_DIGITS = 4;

  /** Copies the map and adds the units of differences. */
  public DisplayUnits {
    Map<Dimension, Unit> all = new EnumMap<>(Dimension.class);
    for (Unit unit : units.values()) {
      all.put(unit.difference().dimension(), unit.difference());
      unit.perMinute().ifPresent(rate -> all.put(rate.dimension(), rate));
    }
    all.putAll(units);
    units = Map.copyOf(all);
  }

  /** Display in one unit alone. */
  public static DisplayUnits of(Unit unit, double atmosphere) {
    return new DisplayUnits(Map.of(unit.dimension(), unit), atmosphere);
  }

  /** The number of an SI value in the display unit of its dimension. */
  public double number(double si, Dimension dimension) {
    Unit unit = units.get(dimension);
    return unit == null ? si : unit.fromSi(si, atmosphere);
  }

  /** The symbol of the display unit. */
  public String symbol(Dimension dimension) {
    Unit unit = units.get(dimension);
    return unit == null ? dimension.siSymbol() : unit.symbol();
  }

  /**
   * Number and unit, for example {@code 199.4 bar(g)}: temperatures to a tenth of a degree,
   * everything else to four significant digits, none of them finer than the dimension deserves.
   *
   * @return a dash for a value that is not finite
   */
  public String format(double si, Dimension dimension) {
    double number = number(si, dimension);
    if (!Double.isFinite(number)) {
      return "–";
    }
    String digits = digits(number, dimension);
    String symbol =
        dimension == Dimension.RATIO && !units.containsKey(dimension) ? "" : symbol(dimension);
    return symbol.isEmpty() ? digits : digits + " " + symbol;
  }

  private String digits(double number, Dimension dimension) {
    return switch (dimension) {
      case TEMPERATURE, TEMPERATURE_DIFFERENCE -> fixed(number, 1);
      case ABSOLUTE_PRESSURE, PRESSURE_DIFFERENCE ->
          significant(number, mostDecimals(10, dimension));
      case MASS, MASS_FLOW, DENSITY, PRESSURE_RATE -> significant(number, 12);
      default -> shortest(number);
    };
  }

  /** Decimals beyond which a digit would be worth less than {@code finest} in SI. */
  private int mostDecimals(double finest, Dimension dimension) {
    double siPerUnit =
        units.containsKey(dimension) ? units.get(dimension).difference().toSi(1, 0) : 1;
    return Math.max(0, (int) Math.round(Math.log10(siPerUnit / finest)));
  }

  private static String significant(double number, int mostDecimals) {
    int leading = number == 0 ? 0 : (int) Math.floor(Math.log10(Math.abs(number)));
    return fixed(number, Math.min(mostDecimals, Math.max(0, SIGNIFICANT_DIGITS - 1 - leading)));
  }

  private static String fixed(double number, int decimals) {
    String digits = String.format(Locale.ROOT, "%." + decimals + "f", number);
    boolean minusNothing = digits.startsWith("-") && !digits.matches(".*[1-9].*");
    return minusNothing ? digits.substring(1) : digits;
  }

  private static String shortest(double number) {
    return number == 0
        ? "0"
        : new BigDecimal(number)
            .round(new MathContext(SIGNIFICANT_DIGITS))
            .stripTrailingZeros()
            .toPlainString();
  }
}
