package org.gasmargin.process.modelled;

import static org.gasmargin.process.modelled.Jobs.STEEL;
import static org.gasmargin.process.modelled.Jobs.first;
import static org.gasmargin.process.modelled.Jobs.layer;
import static org.gasmargin.process.modelled.Jobs.path;
import static org.gasmargin.process.modelled.Jobs.plate;
import static org.gasmargin.process.modelled.Jobs.ventUntil;
import static org.gasmargin.process.modelled.Jobs.vessel;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.flow.Orifice;
import org.gasmargin.gas.IdealGas;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Step;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Vents through an orifice to the atmosphere. */
class OrificeVentTest {
  private static final double ATMOSPHERE = 101325;
  private static final Wall TIGHT = plate(1, 0, 0, layer(STEEL, 0.006));

  /** A wall that holds the gas at its own temperature. */
  private static final Wall THERMOSTAT = plate(1, 1e9, 0, layer(Jobs.material(1e5, 1e7, 1e6), 0.1));

  private static Step.Vent ventFor(double diameter, double duration) {
    return new Step.Vent(
        "1",
        "vessel",
        new Drive.Orifice(
            Interval.exactly(diameter),
            Interval.exactly(0.8),
            Optional.empty(),
            OptionalDouble.of(duration)));
  }

  /**
   * Times to blow down while choked, with and without heat. Closed form from memory, values
   * computed from it.
   */
  @ParameterizedTest
  @CsvSource({
    "28.9655e-3, 0.05, 0.003, 200e5, 10e5, true, 133.35",
    "28.9655e-3, 0.05, 0.003, 200e5, 10e5, false, 118.88",
    "28.0134e-3, 1.0, 0.010, 11e5, 1.9e5, true, 138.37",
    "28.0134e-3, 1.0, 0.010, 11e5, 1.9e5, false, 112.34",
  })
  void timeToBlowDownIsThatOfTheClosedForm(
      double molarMass,
      double volume,
      double diameter,
      double from,
      double to,
      boolean isothermal,
      double expected) {
    IdealGas gas = Jobs.perfectGas(1.4, molarMass);
    Vessel vessel = vessel(gas, volume, from, 293.15, isothermal ? THERMOSTAT : TIGHT);
    Path path = path(first(vessel, 293.15, ventUntil(diameter, 0.8, to)));
    assertEquals(expected, path.duration(), 1e-3 * expected);
    assertEquals(to, path.last().pressure());
  }

  @Test
  void pressureFollowsTheClosedFormOfTheChokedBlowDownAtEveryTime() {
    IdealGas gas = Jobs.perfectGas(1.4, 0.028);
    double start = 300;
    Path path = path(first(vessel(gas, 0.05, 2e7, start, TIGHT), start, ventUntil(3e-3, 0.8, 1e6)));
    double gasConstant = 8.31446261815324 / 0.028;
    double factor = Math.sqrt(1.4) * Math.pow(2 / 2.4, 2.4 / 0.8);
    double area = Math.PI / 4 * 9e-6;
    double tau = 0.05 / (0.8 * area * factor * Math.sqrt(gasConstant * start));
    for (PathPoint point : path.points()) {
      double expected = 2e7 * Math.pow(1 + 0.2 * point.time() / tau, -7);
      assertEquals(expected, point.pressure(), 2e-6 * expected);
    }
  }

  @Test
  void chokingEndsAtTheCriticalPressureRatio() {
    IdealGas gas = Jobs.perfectGas(1.4, 0.028);
    ModelledStep step = first(vessel(gas, 0.05, 2e7, 300, TIGHT), 300, ventUntil(3e-3, 0.8, 1.2e5));
    double time = step.events().get(0).time();
    assertEquals("flow through the orifice is no longer choked", step.events().get(0).what());
    assertEquals("end pressure reached", step.events().get(1).what());
    double critical = ATMOSPHERE * Math.pow(1.2, 3.5);
    assertEquals(critical, Jobs.at(path(step), time).pressure(), 1e-6 * critical);
  }

  @Test
  void realGasFlowAtEachPointIsThatOfTheOrifice() {
    var air = new GasCatalogue().find("air").orElseThrow();
    Wall wall = plate(0.36, 60, 8, layer(STEEL, 0.006));
    Path path =
        path(first(vessel(air, 0.0111, 2e7, 293.15, wall), 293.15, ventUntil(2e-3, 0.8, 3e5)));
    Orifice hole = new Orifice(2e-3, 0.8);
    for (PathPoint point : path.points()) {
      State state = air.atTemperaturePressure(point.temperature(), point.pressure());
      double flow = hole.through(air, state, ATMOSPHERE).massFlow();
      assertEquals(-flow, point.massFlow(), 1e-8 * flow);
      assertEquals(state.molarDensity() * air.molarMass() * 0.0111, point.mass(), 1e-9);
    }
    assertEquals(3e5, path.lowestPressure());
  }

  @Test
  void vesselLeftOpenComesToTheAtmosphereAndStaysThere() {
    IdealGas gas = Jobs.perfectGas(1.4, 0.028);
    Wall wall = plate(0.36, 20, 8, layer(STEEL, 0.006));
    ModelledStep step = first(vessel(gas, 0.0111, 1e6, 293.15, wall), 293.15, ventFor(5e-3, 600));
    Path path = path(step);
    assertEquals(600, path.duration());
    assertEquals(ATMOSPHERE, path.last().pressure(), 0.1);
    assertTrue(path.last().temperature() > path.lowestGasTemperature() + 20);
    assertTrue(step.closure().orElseThrow().holds());
  }

  @Test
  void endPressureAtOrBelowTheAtmosphereIsRefused() {
    IdealGas gas = Jobs.perfectGas(1.4, 0.028);
    ModelledStep step =
        first(vessel(gas, 0.05, 1e6, 300, TIGHT), 300, ventUntil(3e-3, 0.8, ATMOSPHERE));
    assertTrue(step.outcome() instanceof PathOutcome.Failed);
  }

  @Test
  void gasThatCoolsBelowTheAtmosphereInAnOpenVesselIsRefused() {
    IdealGas gas = Jobs.perfectGas(1.4, 0.028);
    Wall cold = plate(0.36, 20, 8, layer(STEEL, 0.006));
    ModelledStep step =
        first(vessel(gas, 0.0111, 1.2e5, 400, 293.15, cold), 293.15, ventFor(5e-3, 600));
    PathOutcome.Failed failed = (PathOutcome.Failed) step.outcome();
    assertTrue(failed.reason().contains("atmosphere"), failed.reason());
  }
}
