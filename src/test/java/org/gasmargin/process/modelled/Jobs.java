package org.gasmargin.process.modelled;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.IdealGas;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.Supply;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.Material;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;

/** Builds vessels and steps out of plain numbers. */
final class Jobs {
  private Jobs() {}

  static final Material STEEL = material(7850, 45, 470);

  static IdealGas perfectGas(double gamma, double molarMass) {
    return new IdealGas("perfect", "Perfect gas", molarMass, gamma);
  }

  static Material material(double density, double conductivity, double heatCapacity) {
    return new Material(
        "user material",
        density,
        List.of(new Material.Point(293.15, conductivity, heatCapacity)),
        "test");
  }

  static Layer layer(Material material, double thickness) {
    return new Layer(material, Interval.exactly(thickness));
  }

  static InsideFilm inside(double coefficient) {
    return new InsideFilm.Given(Interval.exactly(coefficient));
  }

  static OutsideFilm outside(double coefficient) {
    return new OutsideFilm.Given(Interval.exactly(coefficient));
  }

  static Wall plate(double area, double inside, double outside, Layer... layers) {
    return new Wall(new WallShape.Plate(area), List.of(layers), inside(inside), outside(outside));
  }

  static Vessel vessel(Gas gas, double volume, double pressure, double temperature, Wall wall) {
    return vessel(gas, volume, pressure, temperature, temperature, wall);
  }

  static Vessel vessel(
      Gas gas,
      double volume,
      double pressure,
      double temperature,
      double wallTemperature,
      Wall wall) {
    return new Vessel(
        "vessel",
        gas,
        Interval.exactly(volume),
        Interval.exactly(pressure),
        Interval.exactly(temperature),
        Interval.exactly(wallTemperature),
        Optional.of(wall));
  }

  static Site site(double ambient) {
    return new Site(Interval.exactly(ambient), Interval.exactly(101325));
  }

  static Supply supply(double pressure, double temperature) {
    return new Supply("supply", Interval.exactly(pressure), Interval.exactly(temperature));
  }

  static Step.Fill ramp(Supply supply, double until, double within) {
    return fill(supply, new Drive.PressureRamp(Interval.exactly(until), within));
  }

  static Step.Fill flowIn(Supply supply, double massFlow, double duration) {
    return fill(supply, new Drive.MassFlow(Interval.exactly(massFlow), duration));
  }

  static Step.Fill fill(Supply supply, Drive drive) {
    return new Step.Fill("1", "vessel", supply, drive, OptionalDouble.empty());
  }

  static Step.Vent flowOut(double massFlow, double duration) {
    return new Step.Vent("1", "vessel", new Drive.MassFlow(Interval.exactly(massFlow), duration));
  }

  static Step.Vent rampDown(double until, double within) {
    return new Step.Vent("1", "vessel", new Drive.PressureRamp(Interval.exactly(until), within));
  }

  static Step.Vent ventUntil(double diameter, double discharge, double until) {
    return new Step.Vent(
        "1",
        "vessel",
        new Drive.Orifice(
            Interval.exactly(diameter),
            Interval.exactly(discharge),
            Optional.of(Interval.exactly(until)),
            OptionalDouble.empty()));
  }

  static Step.Hold hold(double duration) {
    return new Step.Hold("1", "vessel", duration);
  }

  static ModelledVessel model(Vessel vessel, double ambient) {
    return new ModelledVessel(vessel, site(ambient), ModelInputs.NOMINAL);
  }

  /** Runs a vessel's first step. */
  static ModelledStep first(Vessel vessel, double ambient, Step step) {
    ModelledVessel model = model(vessel, ambient);
    return model.run(step, model.start());
  }

  /** The path of a step that has one; fails with the reason otherwise. */
  static Path path(ModelledStep step) {
    if (step.outcome() instanceof PathOutcome.Computed computed) {
      return computed.path();
    }
    throw new AssertionError("no path: " + step.outcome());
  }

  /** The point of a path at a time, which must be one of its points. */
  static PathPoint at(Path path, double time) {
    return path.points().stream()
        .filter(point -> Math.abs(point.time() - time) <= 1e-9 * Math.max(1, time))
        .findFirst()
        .orElseThrow(() -> new AssertionError("no point at " + time));
  }
}
