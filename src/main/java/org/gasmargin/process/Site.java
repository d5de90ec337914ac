package org.gasmargin.process;

import org.gasmargin.units.Interval;

/**
 * The surroundings of the job.
 *
 * @param ambientTemperature K
 * @param atmosphericPressure Pa absolute
 */
public record Site(Interval ambientTemperature, Interval atmosphericPressure) {}
