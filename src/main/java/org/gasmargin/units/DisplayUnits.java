package org.gasmargin.units;

import java.util.Locale;
import java.util.Map;

/**
 * The units in which results are shown: those that the user typed.
 *
 * @param units one unit for each dimension that is not shown in SI
 * @param atmosphere atmospheric pressure, Pa absolute, for gauge units
 */
public record DisplayUnits(Map<Dimension, Unit> units, double atmosphere) {

  /** Copies the map. */
  public DisplayUnits {
    units = Map.copyOf(units);
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

  /** Number and unit, for example {@code 199.4 bar(g)}. */
  public String format(double si, Dimension dimension) {
    return String.format(Locale.ROOT, "%.1f %s", number(si, dimension), symbol(dimension));
  }
}
