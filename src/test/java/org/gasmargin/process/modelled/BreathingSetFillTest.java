package org.gasmargin.process.modelled;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Step;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * A composite breathing cylinder with aluminium liner charged to 4500 psi(g) in 45 s: liner about
 * 46.7 degC. Status: secondary report of a maker's test without geometry; size, wall, bore and
 * temperatures are assumed. Sanity of order only, no validation.
 */
class BreathingSetFillTest {
  private static final Gas AIR = new GasCatalogue().find("air").orElseThrow();

  /** 6.8 L; bore of a cylinder valve, common practice, no source: 3 to 6 mm. */
  private static Path fill(OptionalDouble bore) {
    Wall wall =
        new Wall(
            new WallShape.Cylinder(0.14, 0.442, false),
            List.of(
                Jobs.layer(Jobs.material(2700, 167, 896), 0.00225),
                Jobs.layer(Jobs.material(1550, 0.7, 1000), 0.007)),
            new InsideFilm.Correlation(),
            new OutsideFilm.StillAir());
    double end = 3.103e7 + 101325;
    Step step =
        new Step.Fill(
            "1",
            "vessel",
            Jobs.supply(3.5e7, 294),
            new Drive.PressureRamp(Interval.exactly(end), 45),
            bore);
    return Jobs.path(Jobs.first(Jobs.vessel(AIR, 0.0068, 101325, 294, wall), 294, step));
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.003, 0.006})
  void linerAndGasAreOfTheReportedOrder(double bore) {
    Path path = fill(OptionalDouble.of(bore));
    double liner = path.peakWallTemperature().orElseThrow() - 273.15;
    assertTrue(liner > 30 && liner < 70, "liner " + liner);
    assertTrue(
        path.peakGasTemperature() > 330 && path.peakGasTemperature() < 390,
        "gas " + path.peakGasTemperature());
    for (PathPoint point : path.points().subList(1, path.points().size())) {
      assertTrue(point.temperature() > point.innerWall().orElseThrow());
    }
  }

  /** Adiabatic 398 K: computed from the reference equation of state of air. */
  @Test
  void gasStaysUnderTheAdiabaticBoundWithoutACreditedJetToo() {
    double bound = 398;
    Path still = fill(OptionalDouble.empty());
    assertTrue(still.peakGasTemperature() < bound + 1, "gas " + still.peakGasTemperature());
    assertTrue(still.peakGasTemperature() > fill(OptionalDouble.of(0.005)).peakGasTemperature());
    assertEquals(0.0068, still.first().mass() / 1.2007, 2e-5);
  }
}
