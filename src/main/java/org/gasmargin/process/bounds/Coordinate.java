package org.gasmargin.process.bounds;

import org.gasmargin.gas.Gas;
import org.gasmargin.gas.State;

/** The quantity that a step prescribes, and along which a bounding path is followed. */
enum Coordinate {
  PRESSURE {
    @Override
    double of(State state) {
      return state.pressure();
    }

    @Override
    State move(PathLaw law, Gas gas, State from, double value) {
      return law.atPressure(gas, from, value);
    }
  },
  DENSITY {
    @Override
    double of(State state) {
      return state.molarDensity();
    }

    @Override
    State move(PathLaw law, Gas gas, State from, double value) {
      return law.atDensity(gas, from, value);
    }
  };

  /** The coordinate of a state: Pa absolute or mol/m3. */
  abstract double of(State state);

  /** Follows a law from a state to a value of the coordinate. */
  abstract State move(PathLaw law, Gas gas, State from, double value);
}
