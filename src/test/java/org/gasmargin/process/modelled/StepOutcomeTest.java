package org.gasmargin.process.modelled;

import static org.gasmargin.process.modelled.Jobs.STEEL;
import static org.gasmargin.process.modelled.Jobs.first;
import static org.gasmargin.process.modelled.Jobs.flowIn;
import static org.gasmargin.process.modelled.Jobs.flowOut;
import static org.gasmargin.process.modelled.Jobs.hold;
import static org.gasmargin.process.modelled.Jobs.layer;
import static org.gasmargin.process.modelled.Jobs.path;
import static org.gasmargin.process.modelled.Jobs.plate;
import static org.gasmargin.process.modelled.Jobs.ramp;
import static org.gasmargin.process.modelled.Jobs.rampDown;
import static org.gasmargin.process.modelled.Jobs.supply;
import static org.gasmargin.process.modelled.Jobs.vessel;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.IdealGas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Step;
import org.gasmargin.process.Supply;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;
import org.junit.jupiter.api.Test;

/** What a step answers when it has no path, a short one, or leaves its validity. */
class StepOutcomeTest {
  private static final IdealGas GAS = Jobs.perfectGas(1.4, 0.028);
  private static final Wall WALL = plate(1.2, 60, 8, layer(STEEL, 0.006));
  private static final Supply SUPPLY = supply(3e7, 300);

  private static Vessel full(double pressure, double temperature) {
    return vessel(GAS, 0.05, pressure, temperature, 300, WALL);
  }

  private static String failure(ModelledStep step) {
    return ((PathOutcome.Failed) step.outcome()).reason();
  }

  @Test
  void rampEndsOnItsTargetAndStaysOnItToTheLastBit() {
    Vessel vessel = full(12e5, 300);
    Path path = path(first(vessel, 300, ramp(SUPPLY, 201.01325e5, 180)));
    assertEquals(201.01325e5, path.last().pressure());
    assertEquals(180, path.duration());
    assertEquals(241, path.points().size());
    for (PathPoint point : path.points()) {
      double expected = 12e5 + (201.01325e5 - 12e5) * point.time() / 180;
      assertEquals(expected, point.pressure(), 1e-12 * expected);
      double amount = point.mass() / GAS.molarMass();
      double density = amount / 0.05;
      double pressure = GAS.at(point.temperature(), density).pressure();
      assertEquals(expected, pressure, 1e-11 * expected);
    }
  }

  @Test
  void vesselWithoutAWallHasNoModelledPath() {
    Vessel bare =
        new Vessel(
            "vessel",
            GAS,
            Interval.exactly(0.05),
            Interval.exactly(1e5),
            Interval.exactly(300),
            Interval.exactly(300),
            Optional.empty());
    ModelledStep step = first(bare, 300, hold(10));
    assertEquals(
        new PathOutcome.Absent("no wall was given, so heat exchange cannot be modelled"),
        step.outcome());
  }

  @Test
  void fillThatIsAlreadyPastItsTargetEndsAtOnceWithANote() {
    ModelledVessel model = Jobs.model(full(2e7, 300), 300);
    VesselCondition start = model.start();
    ModelledStep step = model.run(ramp(SUPPLY, 1e7, 60), start);
    assertEquals(0, path(step).duration());
    assertEquals(2e7, path(step).last().pressure(), 1e-6);
    assertSame(start, step.end().orElseThrow());
    assertTrue(step.notes().get(0).contains("already past"), step.notes().get(0));
  }

  @Test
  void ventThatIsAlreadyPastItsTargetEndsAtOnce() {
    assertEquals(0, path(first(full(1e6, 300), 300, rampDown(2e6, 60))).duration());
    assertEquals(0, path(first(full(1e6, 300), 300, Jobs.ventUntil(3e-3, 1, 2e6))).duration());
  }

  @Test
  void rampThatHeatExchangeOvertakesShutsItsValveUntilItHasCaughtUp() {
    // cold gas in a warm vessel rises faster than the beginning of this slow ramp
    ModelledStep step = first(full(1e6, 200), 300, ramp(SUPPLY, 3e6, 36000));
    Path path = path(step);
    double startMass = path.first().mass();
    assertTrue(step.events().get(0).what().startsWith("the valve opens"), step.events().toString());
    double opened = step.events().get(0).time();
    for (PathPoint point : path.points()) {
      double ramp = 1e6 + 2e6 * point.time() / 36000;
      if (point.time() < opened) {
        assertEquals(startMass, point.mass(), 1e-9 * startMass);
        assertTrue(point.pressure() > ramp * (1 - 1e-8), "at " + point.time());
      } else {
        assertEquals(ramp, point.pressure(), 1e-6 * ramp);
        assertTrue(point.massFlow() > -1e-9);
      }
    }
    assertEquals(3e6, path.last().pressure(), 1e-6);
    assertTrue(step.closure().orElseThrow().holds());
  }

  @Test
  void rampThatHeatExchangeOvertakesForGoodEndsPastItsTargetWithANote() {
    ModelledStep step = first(full(1e6, 200), 300, ramp(SUPPLY, 1.1e6, 36000));
    assertTrue(path(step).last().pressure() > 1.3e6);
    assertEquals(path(step).first().mass(), path(step).last().mass(), 1e-12);
    assertTrue(step.notes().get(0).contains("past the ramp"), step.notes().toString());
  }

  @Test
  void ventOfMoreThanThereIsIsRefused() {
    String reason = failure(first(full(1e6, 300), 300, flowOut(1, 600)));
    assertTrue(reason.contains("more than"), reason);
  }

  @Test
  void ventThatWouldFallBelowTheAtmosphereIsRefused() {
    double mass = GAS.atTemperaturePressure(300, 1e6).molarDensity() * 0.05 * GAS.molarMass();
    String reason = failure(first(full(1e6, 300), 300, flowOut(0.95 * mass / 60, 60)));
    assertTrue(reason.contains("below the atmosphere"), reason);
  }

  @Test
  void fillAboveTheSupplyIsRefused() {
    String reason = failure(first(full(1e6, 300), 300, flowIn(supply(2e6, 300), 0.01, 60)));
    assertTrue(reason.contains("above the supply's"), reason);
    assertTrue(
        failure(first(full(1e6, 300), 300, ramp(supply(2e6, 300), 3e6, 60)))
            .contains("above the supply's"));
  }

  @Test
  void gasThatCondensesInAVentIsRefused() {
    Gas nitrogen = new GasCatalogue().find("nitrogen").orElseThrow();
    Wall tight = plate(1, 0, 0, layer(STEEL, 0.006));
    Vessel cold = vessel(nitrogen, 0.05, 5e6, 160, tight);
    ModelledStep step = first(cold, 160, rampDown(101325, 60));
    assertTrue(step.outcome() instanceof PathOutcome.Failed, () -> "" + step.outcome());
    assertTrue(step.end().isEmpty());
  }

  @Test
  void holdOfNoTimeAndFillThroughAnOrificeAreSaidInWords() {
    assertEquals(List.of("the hold takes no time"), first(full(1e6, 300), 300, hold(0)).notes());
    Step fill =
        Jobs.fill(
            SUPPLY,
            new Drive.Orifice(
                Interval.exactly(3e-3),
                Interval.exactly(0.8),
                Optional.of(Interval.exactly(2e6)),
                OptionalDouble.empty()));
    assertTrue(first(full(1e6, 300), 300, fill).outcome() instanceof PathOutcome.Absent);
  }

  @Test
  void stepsThatFollowStartWhereTheOneBeforeEnded() {
    ModelledVessel model = Jobs.model(full(1e6, 300), 300);
    ModelledStep fill = model.run(ramp(SUPPLY, 1e7, 60), model.start());
    ModelledStep rest = model.run(hold(600), fill.end().orElseThrow());
    PathPoint end = path(fill).last();
    PathPoint start = path(rest).first();
    assertEquals(end.temperature(), start.temperature());
    assertEquals(end.mass(), start.mass());
    assertEquals(end.pressure(), start.pressure(), 1e-9 * end.pressure());
    assertEquals(end.meanWall().orElseThrow(), start.meanWall().orElseThrow(), 1e-9);
    assertTrue(path(rest).last().pressure() < start.pressure());
  }

  @Test
  void jetWithoutABoreAndNumbersBeyondTheCorrelationAreNoted() {
    Gas nitrogen = new GasCatalogue().find("nitrogen").orElseThrow();
    Wall cylinder =
        new Wall(
            new WallShape.Cylinder(0.229, 1.2, false),
            List.of(layer(STEEL, 0.006)),
            new InsideFilm.Correlation(),
            new OutsideFilm.StillAir());
    Vessel vessel = vessel(nitrogen, 0.05, 1e6, 293.15, cylinder);
    Supply bank = supply(3e7, 293.15);
    ModelledStep still = first(vessel, 293.15, ramp(bank, 2e7, 180));
    assertTrue(still.notes().get(0).contains("no stirring by the jet"), "" + still.notes());
    Step.Fill narrow =
        new Step.Fill(
            "1",
            "vessel",
            bank,
            new Drive.PressureRamp(Interval.exactly(2e7), 180),
            OptionalDouble.of(0.0005));
    ModelledStep stirred = first(vessel, 293.15, narrow);
    assertTrue(stirred.notes().get(0).startsWith("Re_d runs from"), "" + stirred.notes());
    assertTrue(
        path(stirred).peakGasTemperature() < path(still).peakGasTemperature() - 5,
        "a jet that stirs cools the gas");
  }
}
