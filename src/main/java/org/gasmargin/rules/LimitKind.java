package org.gasmargin.rules;

import java.util.Arrays;
import java.util.Optional;
import org.gasmargin.units.Dimension;

/** The limits that a job can state for a vessel. */
public enum LimitKind {
  MAX_PRESSURE("max_pressure", Dimension.ABSOLUTE_PRESSURE),
  MIN_PRESSURE("min_pressure", Dimension.ABSOLUTE_PRESSURE),
  TEST_PRESSURE("test_pressure", Dimension.ABSOLUTE_PRESSURE),
  WORKING_PRESSURE("working_pressure", Dimension.ABSOLUTE_PRESSURE),
  MAX_GAS_TEMPERATURE("max_gas_temperature", Dimension.TEMPERATURE),
  MIN_GAS_TEMPERATURE("min_gas_temperature", Dimension.TEMPERATURE),
  MAX_METAL_TEMPERATURE("max_metal_temperature", Dimension.TEMPERATURE),
  MIN_METAL_TEMPERATURE("min_metal_temperature", Dimension.TEMPERATURE),
  IGNITION_TEMPERATURE("ignition_temperature", Dimension.TEMPERATURE),
  MAX_PRESSURE_RATE("max_pressure_rate", Dimension.PRESSURE_RATE);

  private final String key;
  private final Dimension dimension;

  LimitKind(String key, Dimension dimension) {
    this.key = key;
    this.dimension = dimension;
  }

  /** The key in the job file and the name in rule expressions. */
  public String key() {
    return key;
  }

  /** What the limit measures. */
  public Dimension dimension() {
    return dimension;
  }

  /** Whether the limit is a lowest value; if not, it is a highest one. */
  public boolean isMinimum() {
    return this == MIN_PRESSURE || this == MIN_GAS_TEMPERATURE || this == MIN_METAL_TEMPERATURE;
  }

  /** The limit with a key. */
  public static Optional<LimitKind> of(String key) {
    return Arrays.stream(values()).filter(kind -> kind.key.equals(key)).findFirst();
  }
}
