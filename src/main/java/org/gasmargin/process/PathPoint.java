package org.gasmargin.process;

import java.util.OptionalDouble;

/**
 * One instant of a path.
 *
 * @param time since the start of the step, s
 * @param pressure Pa absolute
 * @param temperature mean gas temperature, K
 * @param mass gas in the vessel, kg
 * @param massFlow into the vessel positive, out of it negative, kg/s
 * @param innerWall temperature of the inner surface, K, where a wall is computed
 * @param meanWall mean temperature of the wall by heat content, K, where a wall is computed
 */
public record PathPoint(
    double time,
    double pressure,
    double temperature,
    double mass,
    double massFlow,
    OptionalDouble innerWall,
    OptionalDouble meanWall) {}
