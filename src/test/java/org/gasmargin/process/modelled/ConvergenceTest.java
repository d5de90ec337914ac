package org.gasmargin.process.modelled;

import static org.gasmargin.process.modelled.Jobs.layer;
import static org.gasmargin.process.modelled.Jobs.material;
import static org.gasmargin.process.modelled.Jobs.plate;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.function.IntToDoubleFunction;
import org.gasmargin.gas.IdealGas;
import org.gasmargin.process.Path;
import org.gasmargin.process.Step;
import org.gasmargin.vessel.FilmLaw;
import org.gasmargin.vessel.OutsideExchange;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallConduction;
import org.junit.jupiter.api.Test;

/** The order of the method in its steps and of the wall in its cells, by refinement. */
class ConvergenceTest {
  private static final IdealGas GAS = Jobs.perfectGas(1.4, 0.028);
  private static final Wall PLASTIC =
      plate(
          0.9,
          200,
          8,
          layer(material(950, 0.4, 2250), 0.005),
          layer(material(1550, 0.7, 1000), 0.020));

  private static double endTemperature(Carried carried, Opening opening, int steps) {
    double[] thicknesses = {0.005, 0.020};
    WallConduction wall = new WallConduction(PLASTIC, thicknesses);
    GasWallSystem system =
        new GasWallSystem(
            new GasSide(GAS, new Content.Rigid(0.05), carried, opening),
            new FilmLaw.Constant(200),
            new WallSide(300, wall, new OutsideExchange(PLASTIC, 0.025, 300, 101325, 0)),
            StepPlan.NO_GUARD);
    double amount = GAS.atTemperaturePressure(300, 1e6).molarDensity() * 0.05;
    double[] cells = new double[wall.cells()];
    Arrays.fill(cells, 300);
    double[] start = system.unknowns(amount, 300, cells);
    return new ImplicitIntegrator(1e-7)
        .integrateEvenly(system, start, 30, steps)
        .endUnknowns()[GasWallSystem.TEMPERATURE];
  }

  /** Order from three step sizes against a much finer one. */
  private static double order(IntToDoubleFunction solution, int steps) {
    double fine = solution.applyAsDouble(16 * steps);
    double coarse = Math.abs(solution.applyAsDouble(steps) - fine);
    double half = Math.abs(solution.applyAsDouble(2 * steps) - fine);
    return Math.log(coarse / half) / Math.log(2);
  }

  @Test
  void methodIsOfThirdOrderAtAGivenFlow() {
    double order = order(n -> endTemperature(new Carried.Own(), new Opening.Constant(-0.5), n), 80);
    assertEquals(3, order, 0.25);
  }

  @Test
  void methodIsOfThirdOrderOnAVentingRamp() {
    double order =
        order(n -> endTemperature(new Carried.Own(), new Opening.Ramp(1e6, 2e5, 30), n), 80);
    assertEquals(3, order, 0.25);
  }

  @Test
  void methodIsOfThirdOrderOnAFillingRamp() {
    Carried supply = new Carried.Supply(GAS.atTemperaturePressure(300, 1e7).enthalpy());
    double order = order(n -> endTemperature(supply, new Opening.Ramp(1e6, 2e6, 30), n), 80);
    assertTrue(order > 2.75, "order " + order);
  }

  @Test
  void smallerToleranceLeavesASmallerError() {
    Vessel vessel = Jobs.vessel(GAS, 0.05, 1e7, 300, PLASTIC);
    Step step = Jobs.rampDown(1.1e5, 30);
    double exact = end(vessel, step, 1e-11, 1);
    double loose = Math.abs(end(vessel, step, 1e-7, 1) - exact);
    double tight = Math.abs(end(vessel, step, 1e-9, 1) - exact);
    assertTrue(loose < 1e-3, "error " + loose);
    assertTrue(tight < 0.1 * loose, () -> loose + " falls to " + tight);
  }

  @Test
  void wallIsOfSecondOrderInItsCells() {
    Vessel vessel = Jobs.vessel(GAS, 0.05, 1e6, 300, PLASTIC);
    Step step = Jobs.ramp(Jobs.supply(2e7, 300), 1e7, 60);
    double one = end(vessel, step, 1e-9, 1);
    double two = end(vessel, step, 1e-9, 2);
    double four = end(vessel, step, 1e-9, 4);
    double eight = end(vessel, step, 1e-9, 8);
    assertEquals(4, (one - two) / (two - four), 0.3);
    assertEquals(4, (two - four) / (four - eight), 0.3);
  }

  private static double end(Vessel vessel, Step step, double tolerance, int refinement) {
    ModelledVessel model =
        new ModelledVessel(vessel, Jobs.site(300), ModelInputs.NOMINAL, tolerance, refinement);
    Path path = Jobs.path(model.run(step, model.start()));
    return path.last().temperature();
  }

  @Test
  void listOfStepsRunsWithoutAGap() {
    Carried own = new Carried.Own();
    WallConduction wall = new WallConduction(PLASTIC, new double[] {0.005, 0.020});
    GasWallSystem system =
        new GasWallSystem(
            new GasSide(GAS, new Content.Rigid(0.05), own, new Opening.Constant(-0.5)),
            new FilmLaw.Constant(200),
            new WallSide(300, wall, new OutsideExchange(PLASTIC, 0.025, 300, 101325, 0)),
            StepPlan.NO_GUARD);
    double[] cells = new double[wall.cells()];
    Arrays.fill(cells, 300);
    Trajectory trajectory =
        new ImplicitIntegrator(1e-6)
            .integrate(system, system.unknowns(20, 300, cells), 30, List.of());
    double time = 0;
    for (DenseStep step : trajectory.steps()) {
      assertEquals(time, step.start());
      time = step.end();
    }
    assertEquals(30, time);
  }
}
