package org.gasmargin.process;

import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.units.Interval;

/** What sets the flow of a fill or a vent. */
public sealed interface Drive {

  /**
   * The pressure moves linearly in time from where it is to a target.
   *
   * @param until target pressure, Pa absolute
   * @param within duration, s
   */
  record PressureRamp(Interval until, double within) implements Drive {}

  /**
   * A constant mass flow.
   *
   * @param massFlow kg/s, above zero in the direction of the step
   * @param duration s
   */
  record MassFlow(Interval massFlow, double duration) implements Drive {}

  /**
   * Flow through an orifice between the vessel and the atmosphere, until a pressure or for a time,
   * at least one of the two.
   *
   * @param diameter m
   * @param dischargeCoefficient 0 to 1
   * @param until pressure at which the valve is shut, Pa absolute
   * @param duration longest time, s
   */
  record Orifice(
      Interval diameter,
      Interval dischargeCoefficient,
      Optional<Interval> until,
      OptionalDouble duration)
      implements Drive {}
}
