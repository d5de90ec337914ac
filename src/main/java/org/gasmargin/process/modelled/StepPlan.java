package org.gasmargin.process.modelled;

import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.State;

/** What there is to integrate for a step. */
sealed interface StepPlan {

  /**
   * An integration.
   *
   * @param content how the density follows from what changes
   * @param startExtent amount, mol, or volume, m3
   * @param carried energy that comes with the change
   * @param opening what sets the rate
   * @param duration s; of a step that ends by an event, a time that it cannot need
   * @param guard refuses states
   * @param endPressure pressure at which the step ends, Pa absolute, if an event ends it
   * @param mustReach whether the end pressure must be reached within the duration
   * @param choked tells whether the flow is choked, for an orifice
   * @param jetBore bore of the jet that stirs the gas, m, if known
   */
  record Integration(
      Content content,
      double startExtent,
      Carried carried,
      Opening opening,
      double duration,
      GasWallSystem.Guard guard,
      OptionalDouble endPressure,
      boolean mustReach,
      Optional<Choking> choked,
      OptionalDouble jetBore)
      implements StepPlan {}

  /**
   * A pressure that follows a ramp through a valve that lets gas pass one way only.
   *
   * @param ramp from the pressure at the start to the target
   * @param direction 1 in, -1 out
   * @param flowing the integration while gas flows
   */
  record Ramp(Opening.Ramp ramp, int direction, Flowing flowing) implements StepPlan {}

  /** Plans the flowing part of a ramp. */
  @FunctionalInterface
  interface Flowing {
    /** The integration from a condition along the rest of a ramp. */
    Integration from(VesselCondition start, Opening.Ramp rest);
  }

  /** Tells whether the flow out of a state is choked. */
  @FunctionalInterface
  interface Choking {
    /** Whether it is. */
    boolean at(State gas);
  }

  /**
   * The step is over before it starts.
   *
   * @param note why
   */
  record Over(String note) implements StepPlan {}

  /**
   * There is no modelled path.
   *
   * @param reason why
   */
  record None(String reason) implements StepPlan {}

  /** Refuses nothing. */
  GasWallSystem.Guard NO_GUARD = (time, gas, rate) -> {};
}
