package org.gasmargin.process;

/**
 * The last stretch of the path to an extreme, along which either no heat passes or the volume is
 * constant, so that a closed form can redo it by hand.
 *
 * @param startPressure Pa absolute
 * @param startTemperature K
 * @param endPressure Pa absolute
 * @param endTemperature K
 * @param settling whether the gas takes on the temperature of its surroundings at constant volume;
 *     otherwise no heat passes
 */
public record Stretch(
    double startPressure,
    double startTemperature,
    double endPressure,
    double endTemperature,
    boolean settling) {}
