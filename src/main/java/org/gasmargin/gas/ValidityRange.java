package org.gasmargin.gas;

/**
 * The range within which an equation of state is used.
 *
 * @param minTemperature lowest temperature, K
 * @param maxTemperature highest temperature, K
 * @param maxPressure highest pressure, Pa absolute
 * @param fittedMaxTemperature highest temperature named by the published fit, K; above it, up to
 *     {@code maxTemperature}, the equation extrapolates
 */
public record ValidityRange(
    double minTemperature,
    double maxTemperature,
    double maxPressure,
    double fittedMaxTemperature) {}
