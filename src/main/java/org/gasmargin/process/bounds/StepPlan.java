package org.gasmargin.process.bounds;

import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.State;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.Supply;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.Vessel;

/**
 * What a step asks of the gas, with the tolerances of its inputs: which law holds without heat
 * exchange, along which coordinate, and how far.
 *
 * @param step the step
 * @param vessel the vessel
 * @param site the surroundings
 */
record StepPlan(Step step, Vessel vessel, Site site) {

  /** A word for what happens without exchange of heat. */
  String adiabaticWords() {
    if (step instanceof Step.Vent) {
      return "vent without heat gain";
    }
    return step instanceof Step.Hold ? "" : step.kind() + " without heat loss";
  }

  /** What stays constant without heat exchange, with the hottest or the coldest supply. */
  PathLaw law(boolean hottestSupply) {
    return step instanceof Step.Fill fill
        ? new PathLaw.Charging(supplyEnthalpy(fill.supply(), hottestSupply))
        : new PathLaw.Isentropic();
  }

  /** The coordinate that the step prescribes. */
  Coordinate coordinate() {
    if (step instanceof Step.Compress) {
      return Coordinate.PRESSURE;
    }
    Optional<Drive> drive = drive();
    boolean pressure =
        drive.isPresent()
            && (drive.get() instanceof Drive.PressureRamp
                || (drive.get() instanceof Drive.Orifice orifice && orifice.duration().isEmpty()));
    return pressure ? Coordinate.PRESSURE : Coordinate.DENSITY;
  }

  /** The drive of a fill or a vent. */
  Optional<Drive> drive() {
    if (step instanceof Step.Fill fill) {
      return Optional.of(fill.drive());
    }
    return step instanceof Step.Vent vent ? Optional.of(vent.drive()) : Optional.empty();
  }

  /** Pressure below which a vent cannot go, Pa absolute: that of the atmosphere. */
  OptionalDouble pressureFloor() {
    return step instanceof Step.Vent
        ? OptionalDouble.of(site.atmosphericPressure().low())
        : OptionalDouble.empty();
  }

  /**
   * Where a course ends that enters the step at {@code entry}; empty if nothing moves.
   *
   * @param course the course
   * @param entry state at its start, settled as the course asks
   */
  Optional<Target> target(Course course, State entry) {
    if (step instanceof Step.Compress compress) {
      return rising(compress.until(), entry.pressure());
    }
    return drive().flatMap(drive -> target(drive, course, entry));
  }

  private Optional<Target> target(Drive drive, Course course, State entry) {
    if (drive instanceof Drive.PressureRamp ramp) {
      return step instanceof Step.Fill
          ? rising(ramp.until(), entry.pressure())
          : falling(ramp.until(), entry.pressure());
    }
    if (drive instanceof Drive.MassFlow flow) {
      double near = molarDensityChange(flow.massFlow().low(), vessel.volume().high(), flow);
      double far = molarDensityChange(flow.massFlow().high(), vessel.volume().low(), flow);
      double sign = step instanceof Step.Fill ? 1 : -1;
      double empty = 1e-6 * entry.molarDensity();
      return Optional.of(
          new Target(
              Math.max(entry.molarDensity() + sign * near, empty),
              Math.max(entry.molarDensity() + sign * far, empty)));
    }
    Drive.Orifice orifice = (Drive.Orifice) drive;
    return orifice.duration().isEmpty()
        ? falling(orifice.until().orElseThrow(), entry.pressure())
        : new VentClock(this, orifice).target(course, entry);
  }

  private double molarDensityChange(double massFlow, double volume, Drive.MassFlow flow) {
    return massFlow * flow.duration() / (volume * vessel.gas().molarMass());
  }

  private static Optional<Target> rising(Interval until, double from) {
    return until.high() > from
        ? Optional.of(new Target(Math.max(until.low(), from), until.high()))
        : Optional.empty();
  }

  private static Optional<Target> falling(Interval until, double from) {
    return until.low() < from
        ? Optional.of(new Target(Math.min(until.high(), from), until.low()))
        : Optional.empty();
  }

  /** The highest or lowest enthalpy that the tolerances of the supply allow, J/mol. */
  private double supplyEnthalpy(Supply supply, boolean highest) {
    Gas gas = vessel.gas();
    double temperature = highest ? supply.temperature().high() : supply.temperature().low();
    double atLow = gas.atTemperaturePressure(temperature, supply.pressure().low()).enthalpy();
    double atHigh = gas.atTemperaturePressure(temperature, supply.pressure().high()).enthalpy();
    return highest ? Math.max(atLow, atHigh) : Math.min(atLow, atHigh);
  }
}
