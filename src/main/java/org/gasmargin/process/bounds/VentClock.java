package org.gasmargin.process.bounds;

import java.util.Optional;
import org.gasmargin.flow.Orifice;
import org.gasmargin.gas.State;
import org.gasmargin.process.Drive;
import org.gasmargin.units.Interval;

/**
 * How far a vent through an orifice gets in its time, at the slow and the fast end of its
 * tolerances.
 *
 * @param plan the step
 * @param orifice its orifice, with a duration
 */
record VentClock(StepPlan plan, Drive.Orifice orifice) {

  /** The density range in which the vent ends; empty if the gas does not flow. */
  Optional<Target> target(Course course, State entry) {
    Interval atmosphere = plan.site().atmosphericPressure();
    double stopNear = orifice.until().map(Interval::high).orElse(atmosphere.high());
    double stopFar = orifice.until().map(Interval::low).orElse(atmosphere.low());
    if (entry.pressure() <= stopFar) {
      return Optional.empty();
    }
    Orifice slow = new Orifice(orifice.diameter().low(), orifice.dischargeCoefficient().low());
    Orifice fast = new Orifice(orifice.diameter().high(), orifice.dischargeCoefficient().high());
    double near =
        entry.pressure() <= stopNear
            ? entry.molarDensity()
            : end(
                new OrificeDischarge(
                    course, entry, slow, plan.vessel().volume().high(), atmosphere.high()),
                stopNear);
    double far =
        end(
            new OrificeDischarge(
                course, entry, fast, plan.vessel().volume().low(), atmosphere.low()),
            stopFar);
    return Optional.of(new Target(near, far));
  }

  private double end(OrificeDischarge discharge, double stopPressure) {
    OrificeDischarge.History history =
        discharge.until(stopPressure, orifice.duration().orElseThrow());
    return history.densityAt(history.duration());
  }
}
