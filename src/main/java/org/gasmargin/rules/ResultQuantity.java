package org.gasmargin.rules;

import org.gasmargin.units.Dimension;

/** The computed quantities of a step that a rule can name. */
public enum ResultQuantity {
  PEAK_GAS_TEMPERATURE("peak_gas_temperature", Dimension.TEMPERATURE),
  LOWEST_GAS_TEMPERATURE("lowest_gas_temperature", Dimension.TEMPERATURE),
  PEAK_PRESSURE("peak_pressure", Dimension.ABSOLUTE_PRESSURE),
  LOWEST_PRESSURE("lowest_pressure", Dimension.ABSOLUTE_PRESSURE),
  UNMIXED_TEMPERATURE("unmixed_temperature", Dimension.TEMPERATURE),
  PEAK_METAL_TEMPERATURE("peak_metal_temperature", Dimension.TEMPERATURE),
  LOWEST_METAL_TEMPERATURE("lowest_metal_temperature", Dimension.TEMPERATURE),
  HIGHEST_SETTLED_PRESSURE_15("highest_settled_pressure_15", Dimension.ABSOLUTE_PRESSURE),
  LOWEST_SETTLED_PRESSURE_15("lowest_settled_pressure_15", Dimension.ABSOLUTE_PRESSURE),
  DEVELOPED_PRESSURE_65("developed_pressure_65", Dimension.ABSOLUTE_PRESSURE),
  MEAN_PRESSURE_RATE("mean_pressure_rate", Dimension.PRESSURE_RATE),
  DURATION("duration", Dimension.TIME),
  HIGHEST_START_TEMPERATURE("highest_start_temperature", Dimension.TEMPERATURE),
  LOWEST_AMBIENT_TEMPERATURE("lowest_ambient_temperature", Dimension.TEMPERATURE);

  private final String key;
  private final Dimension dimension;

  ResultQuantity(String key, Dimension dimension) {
    this.key = key;
    this.dimension = dimension;
  }

  /** The name in rule expressions. */
  public String key() {
    return key;
  }

  /** What it measures. */
  public Dimension dimension() {
    return dimension;
  }
}
