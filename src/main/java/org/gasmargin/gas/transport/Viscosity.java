package org.gasmargin.gas.transport;

import org.gasmargin.gas.State;

/** Viscosity of one fluid. Immutable. */
public interface Viscosity {
  /** Dynamic viscosity at a state of that fluid, Pa s. */
  double at(State state);
}
