package org.gasmargin.process.modelled;

import org.gasmargin.gas.State;

/** What sets the rate at which the extent of the gas changes. */
sealed interface Opening {

  /**
   * The pressure runs straight from one value to another; the rate is whatever that needs.
   *
   * @param from Pa absolute
   * @param to Pa absolute
   * @param duration s
   */
  record Ramp(double from, double to, double duration) implements Opening {

    /** Pressure at a time, Pa absolute; exact at both ends. */
    double pressure(double time) {
      double share = Math.min(1, time / duration);
      return from * (1 - share) + to * share;
    }

    /** Rise of the pressure, Pa/s. */
    double rise() {
      return (to - from) / duration;
    }
  }

  /**
   * A constant rate.
   *
   * @param rate mol/s, positive into the vessel
   */
  record Constant(double rate) implements Opening {}

  /**
   * A rate that the state of the gas sets.
   *
   * @param law the rate of a state
   */
  record ByState(Law law) implements Opening {}

  /** Rate as a function of the state of the gas. */
  @FunctionalInterface
  interface Law {
    /** The rate and its slopes. */
    Rate rate(State gas);
  }

  /**
   * A rate with its slopes, which may be approximate: only the speed of the iteration depends on
   * them.
   *
   * @param value mol/s, positive into the vessel
   * @param byDensity derivative by the molar density at constant temperature
   * @param byTemperature derivative by the temperature at constant density
   */
  record Rate(double value, double byDensity, double byTemperature) {}
}
