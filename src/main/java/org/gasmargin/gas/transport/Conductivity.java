package org.gasmargin.gas.transport;

import org.gasmargin.gas.State;

/** Thermal conductivity of one fluid. Immutable. */
public interface Conductivity {
  /** Thermal conductivity at a state of that fluid, W/(m K). */
  double at(State state);
}
