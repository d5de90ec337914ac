package org.gasmargin.process.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.process.Supply;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.Material;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;
import org.junit.jupiter.api.Test;

/** Limits of the modelled path, and several vessels in one job. */
class SimulatorTest {
  private static final double BAR = 1e5;
  private static final double AMBIENT = 293.15;
  private static final Gas NITROGEN = new GasCatalogue().find("nitrogen").orElseThrow();
  private static final Site SITE = new Site(Interval.exactly(AMBIENT), Interval.exactly(101325));

  private static Vessel vessel(String name, boolean walled) {
    Material steel =
        new Material(
            "steel", 7850, List.of(new Material.Point(293, 45, 470)), "invented for a test");
    Wall wall =
        new Wall(
            new WallShape.Plate(1.2),
            List.of(new Layer(steel, Interval.exactly(0.2))),
            new InsideFilm.Given(Interval.exactly(150)),
            new OutsideFilm.Given(Interval.exactly(10)));
    return new Vessel(
        name,
        NITROGEN,
        Interval.exactly(0.05),
        Interval.exactly(10 * BAR),
        Interval.exactly(AMBIENT),
        Interval.exactly(AMBIENT),
        walled ? Optional.of(wall) : Optional.empty());
  }

  private static Step fill(String id, String vessel, double within) {
    return new Step.Fill(
        id,
        vessel,
        new Supply("bank", Interval.exactly(250 * BAR), Interval.exactly(AMBIENT)),
        new Drive.PressureRamp(Interval.exactly(150 * BAR), within),
        OptionalDouble.empty());
  }

  private static StepResult fillIn(double within) {
    return new Simulator()
        .simulate(
            new Procedure(SITE, List.of(vessel("v", true)), List.of(fill("1", "v", within))),
            Credit.NONE)
        .steps()
        .get(0);
  }

  private static double endTemperature(StepResult step, PathKind kind) {
    return step.path(kind).orElseThrow().last().temperature();
  }

  @Test
  void aVerySlowFillIsIsothermal() {
    StepResult slow = fillIn(3e7);
    assertEquals(
        endTemperature(slow, PathKind.ISOTHERMAL), endTemperature(slow, PathKind.MODELLED), 0.02);
  }

  @Test
  void aVeryFastFillIsAdiabatic() {
    StepResult fast = fillIn(1e-4);
    assertEquals(
        endTemperature(fast, PathKind.ADIABATIC), endTemperature(fast, PathKind.MODELLED), 0.02);
  }

  @Test
  void theFasterTheFillTheHotterItEnds() {
    double previous = 0;
    for (double within : new double[] {1e4, 1e3, 300, 100, 30, 10}) {
      double end = endTemperature(fillIn(within), PathKind.MODELLED);
      assertTrue(end > previous, "in " + within + " s: " + end);
      previous = end;
    }
  }

  @Test
  void aVesselThatWaitsWhileAnotherIsFilledIsHeldForThatTime() {
    Procedure procedure =
        new Procedure(
            SITE,
            List.of(vessel("a", true), vessel("b", true)),
            List.of(fill("1", "a", 60), fill("2", "b", 600), new Step.Hold("3", "a", 1)));
    List<StepResult> steps = new Simulator().simulate(procedure, Credit.NONE).steps();
    Path held = steps.get(2).path(PathKind.MODELLED).orElseThrow();
    assertTrue(
        held.first().temperature() < endTemperature(steps.get(0), PathKind.MODELLED) - 3,
        "the gas of a cools while b is filled");
    assertEquals(
        steps.get(0).path(PathKind.MODELLED).orElseThrow().last().mass(), held.last().mass(), 1e-9);
  }

  @Test
  void withoutAWallTheModelledPathIsAbsentAndTheBoundsStand() {
    StepResult step =
        new Simulator()
            .simulate(
                new Procedure(SITE, List.of(vessel("v", false)), List.of(fill("1", "v", 60))),
                Credit.MODELLED)
            .steps()
            .get(0);
    assertInstanceOf(PathOutcome.Absent.class, step.paths().get(PathKind.MODELLED));
    assertTrue(step.credited().isEmpty());
    assertTrue(step.closure().orElseThrow().holds());
    assertTrue(step.envelope().highestGasTemperature().isPresent());
  }

  @Test
  void heatIsNotCreditedInAJobOfSeveralVessels() {
    List<StepResult> steps =
        new Simulator()
            .simulate(
                new Procedure(
                    SITE,
                    List.of(vessel("a", true), vessel("b", true)),
                    List.of(fill("1", "a", 60), fill("2", "b", 60))),
                Credit.MODELLED)
            .steps();
    for (StepResult step : steps) {
      assertTrue(step.credited().isEmpty());
      assertTrue(
          step.notes().stream().anyMatch(note -> note.contains("several vessels")),
          step.notes().toString());
    }
  }

  @Test
  void heatIsNotCreditedAboveTheRangeOfTheCorrelation() {
    Vessel given = vessel("v", true);
    Wall wall = given.wall().orElseThrow();
    Vessel correlated =
        new Vessel(
            "v",
            NITROGEN,
            given.volume(),
            given.startPressure(),
            given.startTemperature(),
            given.startWallTemperature(),
            Optional.of(
                new Wall(
                    new WallShape.Cylinder(0.23, 1.2, true),
                    wall.layers(),
                    new InsideFilm.Correlation(),
                    wall.outside())));
    StepResult gentle = jet(correlated, 600);
    assertTrue(gentle.credited().isPresent(), gentle.notes().toString());
    StepResult fierce = jet(correlated, 4);
    assertTrue(fierce.credited().isEmpty());
    assertTrue(
        fierce.notes().stream().anyMatch(note -> note.contains("cannot be credited")),
        fierce.notes().toString());
  }

  /** A fill through a bore of 6 mm. */
  private static StepResult jet(Vessel vessel, double within) {
    Step.Fill plain = (Step.Fill) fill("1", "v", within);
    Step step = new Step.Fill("1", "v", plain.supply(), plain.drive(), OptionalDouble.of(0.006));
    return new Simulator()
        .simulate(new Procedure(SITE, List.of(vessel), List.of(step)), Credit.MODELLED)
        .steps()
        .get(0);
  }
}
