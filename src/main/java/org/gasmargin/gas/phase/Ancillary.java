package org.gasmargin.gas.phase;

import org.gasmargin.gas.equation.PowerSum;

/**
 * A short correlation along the saturation line: with theta = 1 - T/Tr and S = sum n theta^t, y is
 * formed from S. It starts an iteration or sets a guard; it is never a result.
 *
 * @param form how y follows from S
 * @param reducingTemperature Tr, K
 * @param reducingValue yr, in the unit of y
 * @param maxError largest relative deviation from the equation of state, as stated by its source
 * @param terms rows n, t
 */
public record Ancillary(
    Form form, double reducingTemperature, double reducingValue, double maxError, PowerSum terms) {
  /** How y follows from S. */
  public enum Form {
    /** y = yr (1 + S). */
    LINEAR,
    /** y = yr exp(S). */
    EXPONENTIAL,
    /** y = yr exp(S Tr/T). */
    EXPONENTIAL_REDUCED
  }

  /** Value at a temperature, K; above Tr the value at Tr. */
  public double at(double temperature) {
    double theta = Math.max(0, 1 - temperature / reducingTemperature);
    double sum = terms.at(theta);
    return switch (form) {
      case LINEAR -> reducingValue * (1 + sum);
      case EXPONENTIAL -> reducingValue * Math.exp(sum);
      case EXPONENTIAL_REDUCED -> reducingValue * Math.exp(sum * reducingTemperature / temperature);
    };
  }
}
