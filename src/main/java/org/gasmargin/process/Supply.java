package org.gasmargin.process;

import org.gasmargin.units.Interval;

/**
 * A source whose pressure and temperature do not change while it gives gas. It holds the same gas
 * as the vessel that it fills.
 *
 * @param name name in the job file
 * @param pressure stagnation pressure, Pa absolute
 * @param temperature stagnation temperature, K
 */
public record Supply(String name, Interval pressure, Interval temperature) {}
