package org.gasmargin.process.modelled;

import static org.gasmargin.process.modelled.Jobs.hold;
import static org.gasmargin.process.modelled.Jobs.layer;
import static org.gasmargin.process.modelled.Jobs.material;
import static org.gasmargin.process.modelled.Jobs.path;
import static org.gasmargin.process.modelled.Jobs.plate;
import static org.gasmargin.process.modelled.Jobs.vessel;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.apache.commons.math3.special.Erf;
import org.gasmargin.gas.IdealGas;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;
import org.junit.jupiter.api.Test;

/**
 * Conduction into a wall from gas that is too plentiful to change its temperature. Textbook closed
 * forms, re-derived.
 */
class ConductionClosedFormTest {
  private static final IdealGas GAS = Jobs.perfectGas(1.4, 0.028);
  private static final double CONDUCTIVITY = 0.4;
  private static final double DENSITY = 950;
  private static final double HEAT_CAPACITY = 2250;
  private static final double DIFFUSIVITY = CONDUCTIVITY / (DENSITY * HEAT_CAPACITY);
  private static final Layer THICK_PLASTIC =
      layer(material(DENSITY, CONDUCTIVITY, HEAT_CAPACITY), 0.05);

  private static Path soak(double gasTemperature, Wall wall, double duration) {
    Vessel vessel = vessel(GAS, 1e9, 1e7, gasTemperature, 293.15, wall);
    return path(Jobs.first(vessel, 293.15, hold(duration)));
  }

  /** (Ts - T0)/(Tg - T0) = 1 - exp(eta2) erfc(eta), eta = h sqrt(alpha t)/k. */
  @Test
  void surfaceOfASemiInfiniteWallBehindAFilmFollowsTheErrorFunction() {
    double film = 200;
    Path path = soak(393.15, plate(1, film, 0, THICK_PLASTIC), 120);
    for (PathPoint point : path.points().subList(1, path.points().size())) {
      double eta = film * Math.sqrt(DIFFUSIVITY * point.time()) / CONDUCTIVITY;
      double share = 1 - Math.exp(eta * eta) * Erf.erfc(eta);
      assertEquals(293.15 + 100 * share, point.innerWall().orElseThrow(), 0.03);
    }
  }

  /** Ts - T0 = 2 q/k sqrt(alpha t/pi). */
  @Test
  void surfaceUnderAConstantFluxRisesWithTheRootOfTime() {
    double flux = 200;
    double excess = 9_000; // so hot behind so weak a film that the flux does not change
    Path path = soak(293.15 + excess, plate(1, flux / excess, 0, THICK_PLASTIC), 120);
    for (PathPoint point : path.points().subList(1, path.points().size())) {
      double rise = 2 * flux / CONDUCTIVITY * Math.sqrt(DIFFUSIVITY * point.time() / Math.PI);
      assertEquals(293.15 + rise, point.innerWall().orElseThrow(), 5e-3 + 1e-3 * rise);
    }
  }

  /** Steady heat through films and two radial layers, q = dT / sum of resistances. */
  @Test
  void longSoakOfATwoLayerCylinderEndsAtTheSteadyProfile() {
    double radius = 0.1365;
    double length = 1000; // so long that the ends do not count
    double inside = 200;
    double outside = 8;
    Wall wall =
        new Wall(
            new WallShape.Cylinder(2 * radius, length, true),
            List.of(layer(material(950, 0.4, 2250), 0.005), layer(material(1550, 0.7, 1000), 0.02)),
            Jobs.inside(inside),
            Jobs.outside(outside));
    Path path = soak(353.15, wall, 1e6);
    double middle = radius + 0.005;
    double outer = middle + 0.02;
    double resistance =
        Math.log(middle / radius) / 0.4
            + Math.log(outer / middle) / 0.7
            + 1 / (outside * outer)
            + 1 / (inside * radius);
    double fallInFilm = 60 / (inside * radius) / resistance;
    double gas = path.last().temperature();
    assertEquals(353.15, gas, 0.01);
    assertEquals(gas - fallInFilm, path.last().innerWall().orElseThrow(), 0.01);
  }
}
