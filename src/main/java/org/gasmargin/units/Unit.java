package org.gasmargin.units;

/**
 * The units that a job file can use. A pressure unit is gauge or absolute; a bare pressure unit is
 * a difference. Temperatures come as points (degC) and as differences (K doubles as both).
 */
public enum Unit {
  BAR_ABSOLUTE("bar(a)", Dimension.ABSOLUTE_PRESSURE, 1e5, 0, false),
  BAR_GAUGE("bar(g)", Dimension.ABSOLUTE_PRESSURE, 1e5, 0, true),
  DEGREE_CELSIUS("degC", Dimension.TEMPERATURE, 1, 273.15, false);

  private final String symbol;
  private final Dimension dimension;
  private final double factor;
  private final double offset;
  private final boolean gauge;

  Unit(String symbol, Dimension dimension, double factor, double offset, boolean gauge) {
    this.symbol = symbol;
    this.dimension = dimension;
    this.factor = factor;
    this.offset = offset;
    this.gauge = gauge;
  }

  /** The spelling that the program prints. */
  public String symbol() {
    return symbol;
  }

  /** What the unit measures. */
  public Dimension dimension() {
    return dimension;
  }

  /** Whether a value counts from the atmosphere. */
  public boolean isGauge() {
    return gauge;
  }

  /**
   * Converts into SI.
   *
   * @param value in this unit
   * @param atmosphere atmospheric pressure, Pa absolute; used by gauge units only
   */
  public double toSi(double value, double atmosphere) {
    return value * factor + offset + (gauge ? atmosphere : 0);
  }

  /** Converts from SI into this unit; the inverse of {@link #toSi}. */
  public double fromSi(double si, double atmosphere) {
    return (si - offset - (gauge ? atmosphere : 0)) / factor;
  }
}
