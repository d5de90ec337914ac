package org.gasmargin.process.bounds;

import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.Supply;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.Vessel;

/** Builders of vessels and steps without tolerances and walls. */
final class Procedures {
  static final double BAR = 1e5;
  static final double ATMOSPHERE = 101325;

  private Procedures() {}

  static Site site(double ambient) {
    return new Site(Interval.exactly(ambient), Interval.exactly(ATMOSPHERE));
  }

  static Vessel vessel(Gas gas, double volume, double pressure, double temperature) {
    return new Vessel(
        "receiver",
        gas,
        Interval.exactly(volume),
        Interval.exactly(pressure),
        Interval.exactly(temperature),
        Interval.exactly(temperature),
        Optional.empty());
  }

  static Step fill(double supplyPressure, double supplyTemperature, double until) {
    return new Step.Fill(
        "1",
        "receiver",
        supply(supplyPressure, supplyTemperature),
        new Drive.PressureRamp(Interval.exactly(until), 60),
        OptionalDouble.empty());
  }

  static Step fillByMass(
      double supplyPressure, double supplyTemperature, double massFlow, double duration) {
    return new Step.Fill(
        "1",
        "receiver",
        supply(supplyPressure, supplyTemperature),
        new Drive.MassFlow(Interval.exactly(massFlow), duration),
        OptionalDouble.empty());
  }

  static Supply supply(double pressure, double temperature) {
    return new Supply("bank", Interval.exactly(pressure), Interval.exactly(temperature));
  }

  static Step vent(double until) {
    return new Step.Vent("1", "receiver", new Drive.PressureRamp(Interval.exactly(until), 60));
  }

  static Step orificeVent(double diameter, double coefficient, double until) {
    return new Step.Vent(
        "1",
        "receiver",
        new Drive.Orifice(
            Interval.exactly(diameter),
            Interval.exactly(coefficient),
            Optional.of(Interval.exactly(until)),
            OptionalDouble.empty()));
  }

  static Step compress(double until) {
    return new Step.Compress("1", "receiver", Interval.exactly(until), 0.02);
  }

  static Step hold(double duration) {
    return new Step.Hold("1", "receiver", duration);
  }

  /** Bounds of one step at ambient equal to the start temperature. */
  static BoundStep bounds(Vessel vessel, Step step) {
    BoundTrack track = new BoundTrack(vessel, site(vessel.startTemperature().nominal()));
    return track.advance(step, track.surroundings());
  }

  static Path path(BoundStep bounds, PathKind kind) {
    PathOutcome outcome = bounds.paths().get(kind);
    if (outcome instanceof PathOutcome.Computed computed) {
      return computed.path();
    }
    throw new AssertionError(kind + " was not computed: " + outcome);
  }
}
