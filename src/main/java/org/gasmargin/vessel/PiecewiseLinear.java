package org.gasmargin.vessel;

/**
 * A property that is piecewise linear in temperature and constant beyond the ends of its table,
 * with its exact slope and integral.
 */
final class PiecewiseLinear {
  private final double[] temperatures;
  private final double[] values;
  private final double[] integrals;

  /**
   * A property from its table.
   *
   * @param temperatures K, rising, at least one
   * @param values as many
   */
  PiecewiseLinear(double[] temperatures, double[] values) {
    this.temperatures = temperatures.clone();
    this.values = values.clone();
    this.integrals = new double[values.length];
    for (int i = 1; i < values.length; i++) {
      double width = temperatures[i] - temperatures[i - 1];
      integrals[i] = integrals[i - 1] + 0.5 * (values[i] + values[i - 1]) * width;
    }
  }

  /** The value at a temperature, K. */
  double at(double temperature) {
    int i = segment(temperature);
    return i < 0 ? end(temperature) : values[i] + slope(i) * (temperature - temperatures[i]);
  }

  /** The slope at a temperature, per K; zero beyond the ends. */
  double slopeAt(double temperature) {
    int i = segment(temperature);
    return i < 0 ? 0 : slope(i);
  }

  /** The integral from the first temperature of the table to {@code temperature}, K. */
  double integralTo(double temperature) {
    int i = segment(temperature);
    if (i < 0) {
      boolean below = temperature < temperatures[0];
      int nearest = below ? 0 : values.length - 1;
      return integrals[nearest] + values[nearest] * (temperature - temperatures[nearest]);
    }
    double step = temperature - temperatures[i];
    return integrals[i] + (values[i] + 0.5 * slope(i) * step) * step;
  }

  /**
   * The integral over a step from a temperature, precise to the last digit of a small step.
   *
   * @param from K
   * @param step K, of either sign
   */
  double integralOver(double from, double step) {
    boolean same =
        segment(from) == segment(from + step) && (segment(from) >= 0 || sameSide(from, step));
    return same
        ? (at(from) + 0.5 * slopeAt(from) * step) * step
        : integralTo(from + step) - integralTo(from);
  }

  private boolean sameSide(double from, double step) {
    return values.length == 1 || (from < temperatures[0]) == (from + step < temperatures[0]);
  }

  private double end(double temperature) {
    return temperature < temperatures[0] ? values[0] : values[values.length - 1];
  }

  private double slope(int i) {
    return (values[i + 1] - values[i]) / (temperatures[i + 1] - temperatures[i]);
  }

  /** Index of the segment that holds the temperature, or -1 beyond the ends. */
  private int segment(double temperature) {
    for (int i = 0; i + 1 < values.length; i++) {
      if (temperature >= temperatures[i] && temperature < temperatures[i + 1]) {
        return i;
      }
    }
    return -1;
  }
}
