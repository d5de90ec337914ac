package org.gasmargin.process.modelled;

import static org.gasmargin.process.modelled.Jobs.STEEL;
import static org.gasmargin.process.modelled.Jobs.first;
import static org.gasmargin.process.modelled.Jobs.flowIn;
import static org.gasmargin.process.modelled.Jobs.flowOut;
import static org.gasmargin.process.modelled.Jobs.layer;
import static org.gasmargin.process.modelled.Jobs.path;
import static org.gasmargin.process.modelled.Jobs.plate;
import static org.gasmargin.process.modelled.Jobs.ramp;
import static org.gasmargin.process.modelled.Jobs.rampDown;
import static org.gasmargin.process.modelled.Jobs.supply;
import static org.gasmargin.process.modelled.Jobs.vessel;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.gasmargin.gas.IdealGas;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.junit.jupiter.api.Test;

/**
 * Closed forms of an ideal gas with constant heat capacities. Status of each: textbook closed form,
 * formula from memory and re-derived; values computed from it.
 */
class ClosedFormTest {
  private static final double MOLAR_MASS = 0.028;
  private static final IdealGas DIATOMIC = Jobs.perfectGas(1.4, MOLAR_MASS);

  /** A wall that takes no heat. */
  private static final Wall TIGHT = plate(1, 0, 0, layer(STEEL, 0.006));

  /** A wall so conducting and heavy that it keeps its temperature. */
  private static Wall constantTemperatureWall(double area, double film) {
    return plate(area, film, 0, layer(Jobs.material(1e5, 1e7, 1e6), 0.1));
  }

  @Test
  void freeFillingOfAnEvacuatedVesselEndsAtGammaTimesSupplyTemperature() {
    Vessel vessel = vessel(DIATOMIC, 0.05, 0.01, 300, TIGHT);
    Path path = path(first(vessel, 300, ramp(supply(2e7, 300), 1e6, 10)));
    assertEquals(420.00, path.last().temperature(), 1e-4);
  }

  @Test
  void chargeOfAPartlyFullVesselFollowsTheClosedForm() {
    Vessel vessel = vessel(DIATOMIC, 0.05, 1e5, 300, TIGHT);
    Path path = path(first(vessel, 300, ramp(supply(2e7, 300), 1e6, 60)));
    assertEquals(420 / (1 + 0.1 * (420 / 300.0 - 1)), path.last().temperature(), 1e-5);
    assertEquals(7.42857, path.last().mass() / path.first().mass(), 1e-5);
    assertEquals(1e6, path.last().pressure());
  }

  @Test
  void ventedGasStaysOnItsIsentrope() {
    Vessel vessel = vessel(DIATOMIC, 0.05, 1e6, 300, TIGHT);
    Path path = path(first(vessel, 300, rampDown(101325, 60)));
    double ratio = Math.pow(0.101325, 0.4 / 1.4);
    assertEquals(300 * ratio, path.last().temperature(), 1e-4);
    assertEquals(0.101325 / ratio, path.last().mass() / path.first().mass(), 1e-6);
  }

  @Test
  void fillAtConstantFlowAndFilmFollowsTheClosedForm() {
    double area = 0.8;
    double film = 60;
    double wall = 295;
    double flow = 0.004;
    double supply = 320;
    Vessel vessel = vessel(DIATOMIC, 0.05, 5e5, 280, wall, constantTemperatureWall(area, film));
    Path path = path(first(vessel, wall, flowIn(supply(1e8, supply), flow, 120)));
    double cv = 2.5 * 8.31446261815324 / MOLAR_MASS;
    double alpha = film * area / (flow * cv);
    double limit = (1.4 * supply + alpha * wall) / (1 + alpha);
    for (PathPoint point : path.points()) {
      double mass = path.first().mass() + flow * point.time();
      double expected = limit + (280 - limit) * Math.pow(mass / path.first().mass(), -(1 + alpha));
      assertEquals(mass, point.mass(), 1e-9 * mass);
      assertEquals(expected, point.temperature(), 2e-4);
    }
  }

  @Test
  void ventAtConstantFlowAndFilmFollowsTheClosedForm() {
    double area = 0.8;
    double film = 30;
    double wall = 295;
    double flow = 0.004;
    Vessel vessel = vessel(DIATOMIC, 0.05, 1e7, 310, wall, constantTemperatureWall(area, film));
    Path path = path(first(vessel, wall, flowOut(flow, 1200)));
    double cv = 2.5 * 8.31446261815324 / MOLAR_MASS;
    double alpha = film * area / (flow * cv);
    double limit = alpha * wall / (0.4 + alpha);
    for (PathPoint point : path.points()) {
      double share = 1 - flow * point.time() / path.first().mass();
      double expected = limit + (310 - limit) * Math.pow(share, 0.4 + alpha);
      assertEquals(expected, point.temperature(), 2e-4);
    }
    assertTrue(path.last().mass() < 0.2 * path.first().mass());
  }
}
