package org.gasmargin.job;

import org.gasmargin.units.Dimension;

/**
 * The kinds of quantity in a job file: what they measure, whether the calculation carries their
 * tolerance, and the window outside which the reader asks whether the value is meant. The windows
 * (common practice, no source) are wide enough for workshop and plant equipment and narrow enough
 * to stop a slip of a unit.
 */
enum InputKind {
  ATMOSPHERIC_PRESSURE("an atmospheric pressure", Dimension.ABSOLUTE_PRESSURE, true, 5e4, 1.1e5),
  AMBIENT_TEMPERATURE("an ambient temperature", Dimension.TEMPERATURE, true, 213.15, 333.15),
  PRESSURE("a pressure", Dimension.ABSOLUTE_PRESSURE, true, 10, 1.1e8),
  GAS_TEMPERATURE("a gas temperature", Dimension.TEMPERATURE, true, 173.15, 473.15),
  WALL_TEMPERATURE("a wall temperature", Dimension.TEMPERATURE, true, 173.15, 473.15),
  PRESSURE_LIMIT("a pressure limit", Dimension.ABSOLUTE_PRESSURE, true, 10, 1.6e8),
  TEMPERATURE_LIMIT("a temperature limit", Dimension.TEMPERATURE, true, 20, 1300),
  RATE_LIMIT("a limit of the pressure rate", Dimension.PRESSURE_RATE, true, 1, 1e9),
  PRESSURE_MARGIN("a margin of pressure", Dimension.PRESSURE_DIFFERENCE, false, 0, 2e7),
  TEMPERATURE_MARGIN("a margin of temperature", Dimension.TEMPERATURE_DIFFERENCE, false, 0, 300),
  RATE_MARGIN("a margin of the pressure rate", Dimension.PRESSURE_RATE, false, 0, 1e8),
  VOLUME("a volume", Dimension.VOLUME, true, 1e-7, 200),
  DIAMETER("an inner diameter", Dimension.LENGTH, false, 5e-4, 10),
  VESSEL_LENGTH("a vessel's length", Dimension.LENGTH, false, 1e-3, 100),
  AREA("a wall's area", Dimension.AREA, false, 1e-5, 2000),
  THICKNESS("a layer's thickness", Dimension.LENGTH, true, 2e-5, 0.5),
  CONDUCTIVITY("a thermal conductivity", Dimension.CONDUCTIVITY, false, 0.005, 2500),
  DENSITY("a wall's density", Dimension.DENSITY, false, 10, 23_000),
  HEAT_CAPACITY("a heat capacity", Dimension.HEAT_CAPACITY, false, 50, 10_000),
  FILM_COEFFICIENT("a film coefficient", Dimension.FILM_COEFFICIENT, true, 0.5, 50_000),
  WIND_SPEED("a wind speed", Dimension.VELOCITY, false, 0.1, 60),
  ORIFICE("an orifice", Dimension.LENGTH, true, 5e-5, 0.3),
  INLET_DIAMETER("an inlet", Dimension.LENGTH, false, 1e-4, 0.5),
  DISCHARGE_COEFFICIENT("a discharge coefficient", Dimension.RATIO, true, 0.2, 1),
  DURATION("a time", Dimension.TIME, false, 0.01, 30 * 86_400.0),
  RISE_TIME("the time of a sudden pressure rise", Dimension.TIME, false, 0, 600),
  SHARE("a share of a mixture", Dimension.RATIO, false, 1e-9, 1),
  MASS_FLOW("a mass flow", Dimension.MASS_FLOW, true, 1e-8, 100);

  private final String noun;
  private final Dimension dimension;
  private final boolean tolerant;
  private final double usualLow;
  private final double usualHigh;

  InputKind(String noun, Dimension dimension, boolean tolerant, double usualLow, double usualHigh) {
    this.noun = noun;
    this.dimension = dimension;
    this.tolerant = tolerant;
    this.usualLow = usualLow;
    this.usualHigh = usualHigh;
  }

  /** The name with its article, for messages. */
  String noun() {
    return noun;
  }

  Dimension dimension() {
    return dimension;
  }

  /** Whether a tolerance has a place to go in the records of the job. */
  boolean isTolerant() {
    return tolerant;
  }

  /**
   * Whether a gauge value counts from the nominal atmosphere: a limit belongs to the vessel and
   * does not move with the barometer.
   */
  boolean isFixedToVessel() {
    return this == PRESSURE_LIMIT;
  }

  /** Lowest usual value, SI; a value below asks for confirmation. */
  double usualLow() {
    return usualLow;
  }

  /** Highest usual value, SI; a value above asks for confirmation. */
  double usualHigh() {
    return usualHigh;
  }

  /** Whether zero itself is allowed: for margins and for a rise at once. */
  boolean allowsZero() {
    return usualLow == 0;
  }
}
