package org.gasmargin.flow;

/**
 * Flow through a restriction.
 *
 * @param massFlow kg/s, zero or above
 * @param choked whether the throat is at the speed of sound, so that the back pressure has no
 *     influence
 * @param throatPressure static pressure in the throat, Pa absolute
 */
public record FlowResult(double massFlow, boolean choked, double throatPressure) {}
