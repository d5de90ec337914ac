package org.gasmargin.process.modelled;

import static org.gasmargin.process.modelled.Jobs.STEEL;
import static org.gasmargin.process.modelled.Jobs.first;
import static org.gasmargin.process.modelled.Jobs.layer;
import static org.gasmargin.process.modelled.Jobs.path;
import static org.gasmargin.process.modelled.Jobs.plate;
import static org.gasmargin.process.modelled.Jobs.vessel;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.gasmargin.gas.Gas;
import org.gasmargin.gas.IdealGas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Step;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.junit.jupiter.api.Test;

/** Trapped gas compressed by gas that rushes in behind it. */
class CompressTest {
  private static final Wall TIGHT = plate(0.1, 0, 0, layer(STEEL, 0.006));

  private static Step.Compress to(double pressure, double within) {
    return new Step.Compress("1", "vessel", Interval.exactly(pressure), within);
  }

  /** Encyclopaedia worked example: 1 L at 100 kPa, 300 K to 0.1 L: 2.51 MPa, 753.6 K. */
  @Test
  void perfectGasWithoutHeatLossFollowsItsIsentrope() {
    IdealGas gas = Jobs.perfectGas(1.4, 0.029);
    double end = 1e5 * Math.pow(10, 1.4);
    Path path = path(first(vessel(gas, 1e-3, 1e5, 300, TIGHT), 300, to(end, 0.02)));
    assertEquals(753.57, path.last().temperature(), 0.01);
    assertEquals(2.5119e6, path.last().pressure(), 50);
    assertEquals(path.first().mass(), path.last().mass());
  }

  @Test
  void realOxygenWithoutHeatLossFollowsItsIsentrope() {
    Gas oxygen = new GasCatalogue().find("oxygen").orElseThrow();
    Path path = path(first(vessel(oxygen, 1e-4, 101325, 293.15, TIGHT), 293.15, to(2e7, 0.02)));
    double entropy = oxygen.atTemperaturePressure(293.15, 101325).entropy();
    double expected = oxygen.atPressureEntropy(2e7, entropy).temperature();
    assertEquals(expected, path.last().temperature(), 5e-6 * expected);
  }

  @Test
  void heatLossLiesBetweenTheIsentropeAndTheWall() {
    Gas oxygen = new GasCatalogue().find("oxygen").orElseThrow();
    Wall steel = plate(0.08, 500, 8, layer(STEEL, 0.003));
    Vessel bore = vessel(oxygen, 1e-4, 101325, 293.15, steel);
    double entropy = oxygen.atTemperaturePressure(293.15, 101325).entropy();
    double before = 2000;
    for (double within : new double[] {0.02, 0.2, 2, 20, 200}) {
      ModelledStep step = first(bore, 293.15, to(2e7, within));
      Path path = path(step);
      for (PathPoint point : path.points()) {
        double hottest = oxygen.atPressureEntropy(point.pressure(), entropy).temperature();
        assertTrue(point.temperature() <= hottest * (1 + 1e-6));
        assertTrue(point.temperature() >= 293.15 - 1e-6);
      }
      assertTrue(step.closure().orElseThrow().holds());
      assertTrue(path.last().temperature() < before, "slower is cooler");
      before = path.last().temperature();
    }
    assertTrue(before < 400, "slow compression stays near the wall, " + before);
  }

  @Test
  void suddenCompressionHasNoModelledPath() {
    IdealGas gas = Jobs.perfectGas(1.4, 0.029);
    ModelledStep step = first(vessel(gas, 1e-3, 1e5, 300, TIGHT), 300, to(1e6, 0));
    assertTrue(step.outcome() instanceof PathOutcome.Absent);
  }

  @Test
  void conditionAfterwardsIsNotClaimed() {
    IdealGas gas = Jobs.perfectGas(1.4, 0.029);
    ModelledStep step = first(vessel(gas, 1e-3, 1e5, 300, TIGHT), 300, to(1e6, 1));
    assertTrue(step.end().isEmpty());
  }
}
