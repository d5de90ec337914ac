package org.gasmargin.vessel;

import java.util.Optional;
import org.gasmargin.gas.Gas;
import org.gasmargin.units.Interval;

/**
 * A rigid vessel, pipe or dead leg with the gas that is in it at the start.
 *
 * @param name name in the job file
 * @param gas the gas inside
 * @param volume m3
 * @param startPressure Pa absolute
 * @param startTemperature K
 * @param startWallTemperature K; ambient if the job does not give it
 * @param wall the wall, if the job describes it
 */
public record Vessel(
    String name,
    Gas gas,
    Interval volume,
    Interval startPressure,
    Interval startTemperature,
    Interval startWallTemperature,
    Optional<Wall> wall) {}
