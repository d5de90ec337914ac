package org.gasmargin.gas.phase;

import org.gasmargin.gas.equation.PowerSum;

/**
 * Melting pressure over a range of temperature, p = p0 (1 + sum a ((T/T0)^c - 1)) or, in the
 * absolute (Simon) form, p = p0 + sum a ((T/T0)^c - 1). Above it the fluid is solid and an equation
 * of state has no meaning, although it still returns numbers.
 */
public final class MeltingLine {
  private final double referenceTemperature;
  private final double referencePressure;
  private final double scale;
  private final double minTemperature;
  private final double maxTemperature;
  private final PowerSum terms;
  private final double startPressure;
  private final double startSlope;

  /**
   * @param referenceTemperature T0, K
   * @param referencePressure p0, Pa
   * @param relative whether the coefficients multiply p0 (otherwise they are pressures, Pa)
   * @param minTemperature where the line begins, K
   * @param maxTemperature where the line ends, K
   * @param terms rows a, c
   */
  public MeltingLine(
      double referenceTemperature,
      double referencePressure,
      boolean relative,
      double minTemperature,
      double maxTemperature,
      PowerSum terms) {
    this.referenceTemperature = referenceTemperature;
    this.referencePressure = referencePressure;
    this.scale = relative ? referencePressure : 1;
    this.minTemperature = minTemperature;
    this.maxTemperature = maxTemperature;
    this.terms = terms;
    startPressure = pressure(minTemperature);
    startSlope = scale * terms.slope(minTemperature / referenceTemperature) / referenceTemperature;
  }

  /** Melting pressure, Pa, at a temperature within the range. */
  public final double pressure(double temperature) {
    double rise = terms.at(temperature / referenceTemperature) - terms.at(1);
    return referencePressure + scale * rise;
  }

  /** Whether the fluid at T, K, and p, Pa, is solid; false outside the range of the line. */
  public boolean isSolid(double temperature, double pressure) {
    if (temperature < minTemperature || temperature > maxTemperature) {
      return false;
    }
    // Melting lines bend upwards: below the first tangent nothing is solid, and no power is needed.
    double tangent = startPressure + startSlope * (temperature - minTemperature);
    return pressure > tangent && pressure > pressure(temperature);
  }
}
