package org.gasmargin.job;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.Step;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.rules.Limit;
import org.gasmargin.rules.LimitKind;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.Entry;
import org.gasmargin.units.Interval;
import org.gasmargin.units.Place;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class JobReaderTest {
  private static final double ATMOSPHERE = 1.013e5;

  @Test
  void readsEveryValueOfTheSketch() {
    Job job = Jobs.resource("/jobs/sketch.yaml");

    assertEquals("Top-up of a ring-main receiver", job.title());
    assertEquals("J-0142", job.number());
    assertEquals("A", job.revision());
    assertEquals("", job.preparedBy());
    assertEquals(List.of("general", "cylinder_fill"), job.rulePacks());
    assertEquals(JudgeOn.BOUNDS, job.judgeOn());
    assertInterval(293.15, 297.15, 301.15, job.procedure().site().ambientTemperature());

    Vessel receiver = job.procedure().vessels().get(0);
    assertEquals("receiver", receiver.name());
    assertEquals("air", receiver.gas().id());
    assertInterval(0.0495, 0.05, 0.0505, receiver.volume());
    assertInterval(
        11e5 + ATMOSPHERE, 12e5 + ATMOSPHERE, 13e5 + ATMOSPHERE, receiver.startPressure());
    assertInterval(297.15, 297.15, 297.15, receiver.startTemperature());
    assertEquals(job.procedure().site().ambientTemperature(), receiver.startWallTemperature());
    Wall wall = receiver.wall().orElseThrow();
    assertEquals(new WallShape.Cylinder(0.229, 1.4, false), wall.shape());
    assertEquals("cr_mo_steel", wall.layers().get(0).material().name());
    assertInterval(0.0058, 0.0058, 0.0058, wall.layers().get(0).thickness());
    assertInstanceOf(InsideFilm.Correlation.class, wall.inside());
    assertInstanceOf(OutsideFilm.StillAir.class, wall.outside());
  }

  @Test
  void readsTheStepsOfTheSketch() {
    List<Step> steps = Jobs.resource("/jobs/sketch.yaml").procedure().steps();

    Step.Fill fill = assertInstanceOf(Step.Fill.class, steps.get(0));
    assertEquals("1", fill.id());
    assertInterval(300e5 + ATMOSPHERE, fill.supply().pressure());
    Drive.PressureRamp ramp = assertInstanceOf(Drive.PressureRamp.class, fill.drive());
    assertInterval(200e5 + ATMOSPHERE, ramp.until());
    assertEquals(180, ramp.within());
    assertEquals(OptionalDouble.empty(), fill.inletDiameter());
    assertEquals(new Step.Hold("2", "receiver", 1800), steps.get(1));
    Step.Vent vent = assertInstanceOf(Step.Vent.class, steps.get(2));
    Drive.Orifice orifice = assertInstanceOf(Drive.Orifice.class, vent.drive());
    assertInterval(0.003, orifice.diameter());
    assertInterval(0.8, orifice.dischargeCoefficient());
    assertInterval(10e5 + ATMOSPHERE, orifice.until().orElseThrow());
    assertEquals(OptionalDouble.empty(), orifice.duration());
  }

  @Test
  void keepsLimitsWithTheirSource() {
    List<Limit> limits = Jobs.limits(Jobs.resource("/jobs/sketch.yaml"), "receiver");

    assertEquals(
        List.of(
            LimitKind.MAX_PRESSURE, LimitKind.MAX_GAS_TEMPERATURE, LimitKind.MIN_METAL_TEMPERATURE),
        limits.stream().map(Limit::kind).toList());
    assertEquals(Optional.of("fill procedure 7.2"), limits.get(1).readFrom());
    assertInterval(338.15, limits.get(1).value().si());
    assertInterval(253.15, limits.get(2).value().si());
  }

  @Test
  void listsEveryQuantityAsTypedInTheOrderOfTheFile() {
    List<Entry> entries = Jobs.resource("/jobs/sketch.yaml").entries();

    assertEquals(19, entries.size());
    assertEquals(
        new Entry(
            "site.ambient_temperature",
            "24 degC ± 4 K",
            Optional.empty(),
            new Place("sketch.yaml", 2, 29)),
        entries.get(0));
    assertEquals(
        new Entry(
            "vessels.receiver.limits.max_pressure",
            "200 bar(g)",
            Optional.of("nameplate"),
            new Place("sketch.yaml", 13, 29)),
        entries.get(8));
    assertEquals("steps.3.vent.until", entries.get(18).path());
  }

  @Test
  void showsResultsInTheUnitsOfTheVesselsNotOfTheBarometer() {
    Job job = Jobs.resource("/jobs/sketch.yaml");

    assertEquals(
        "199.4 bar(g)", job.units().format(199.4e5 + ATMOSPHERE, Dimension.ABSOLUTE_PRESSURE));
    assertEquals("65.0 degC", job.units().format(338.15, Dimension.TEMPERATURE));
    assertEquals("3 min", job.units().format(180, Dimension.TIME));
    assertEquals("2.500 bar", job.units().format(2.5e5, Dimension.PRESSURE_DIFFERENCE));
  }

  @Test
  void readsWallsByNumbersAndFlowsByMass() {
    Procedure procedure = Jobs.resource("/jobs/numbers.yaml").procedure();

    Wall wall = procedure.vessels().get(0).wall().orElseThrow();
    assertEquals(new WallShape.Plate(1.2), wall.shape());
    assertEquals(new InsideFilm.Given(Interval.exactly(150)), wall.inside());
    assertEquals(new OutsideFilm.Given(Interval.exactly(8)), wall.outside());
    Layer layer = wall.layers().get(0);
    assertEquals(7850, layer.material().density());
    assertEquals(45, layer.material().points().get(0).conductivity());
    assertEquals(470, layer.material().points().get(0).heatCapacity());
    Step.Fill fill = assertInstanceOf(Step.Fill.class, procedure.steps().get(0));
    assertEquals(new Drive.MassFlow(Interval.exactly(0.0114), 180), fill.drive());
    assertEquals(OptionalDouble.of(0.008), fill.inletDiameter());
    Step.Vent vent = assertInstanceOf(Step.Vent.class, procedure.steps().get(1));
    assertEquals(new Drive.MassFlow(Interval.exactly(0.28), 300), vent.drive());
  }

  @Test
  void readsEveryOtherFormOfTheGrammar() {
    Job job = Jobs.resource("/jobs/every-form.yaml");

    assertEquals(JudgeOn.MODELLED, job.judgeOn());
    assertInterval(303.15, Jobs.vessel(job, "ball").startWallTemperature());
    assertEquals(new WallShape.Sphere(0.5), Jobs.vessel(job, "ball").wall().orElseThrow().shape());
    assertEquals(new OutsideFilm.Wind(3), Jobs.vessel(job, "ball").wall().orElseThrow().outside());
    assertEquals(
        new OutsideFilm.WaterBath(), Jobs.vessel(job, "bath").wall().orElseThrow().outside());
    assertEquals(
        new OutsideFilm.Insulated(), Jobs.vessel(job, "flask").wall().orElseThrow().outside());
    assertEquals("nitrogen", Jobs.vessel(job, "flask").gas().id());
    assertEquals(OptionalDouble.of(5), Jobs.limits(job, "ball").get(7).requiredMargin());
    assertEquals(OptionalDouble.of(1e6), Jobs.limits(job, "ball").get(2).requiredMargin());
    assertEquals(Optional.empty(), Jobs.limits(job, "ball").get(0).readFrom());
  }

  @Test
  void holdWithoutVesselHoldsEachVessel() {
    List<Step> steps = Jobs.resource("/jobs/every-form.yaml").procedure().steps();

    assertEquals(
        List.of("1", "2", "3", "4", "5.ball", "5.bath", "5.flask", "6", "7", "8"),
        steps.stream().map(Step::id).toList());
    assertEquals(new Step.Hold("5.bath", "bath", 60), steps.get(5));
  }

  @Test
  void compressTakesTheSuppliesPressureUnlessATargetIsGiven() {
    List<Step> steps = Jobs.resource("/jobs/every-form.yaml").procedure().steps();

    Step.Compress sudden = assertInstanceOf(Step.Compress.class, steps.get(8));
    assertInterval(145e5 + ATMOSPHERE, 150e5 + ATMOSPHERE, 155e5 + ATMOSPHERE, sudden.until());
    assertEquals(0, sudden.within());
    Step.Compress slower = assertInstanceOf(Step.Compress.class, steps.get(9));
    assertInterval(160e5 + ATMOSPHERE, slower.until());
    assertEquals(0.1, slower.within());
  }

  @Test
  void sharesOfOneGasUnderTwoNamesAreThatGas() {
    String text =
        Jobs.text("/jobs/sketch.yaml").replace("gas: air", "gas: {nitrogen: 60 %, N2: 40 %}");
    Job job = Jobs.READER.read("job.yaml", text);
    assertEquals("nitrogen", job.procedure().vessels().get(0).gas().id());
  }

  @Test
  void anUnusualValueIsTakenOnceItIsConfirmed() {
    String text =
        BrokenJobs.text("two-thousand-bar") + "confirmed: [vessels.receiver.limits.max_pressure]\n";
    Job job = Jobs.READER.read("job.yaml", text);
    assertInterval(2000e5 + ATMOSPHERE, Jobs.limits(job, "receiver").get(0).value().si());
    Entry last = job.entries().get(job.entries().size() - 1);
    assertEquals("confirmed.1", last.path());
    assertEquals("vessels.receiver.limits.max_pressure", last.typed());
  }

  @Test
  void aGaugeLimitCountsFromTheNominalAtmosphereAndAGaugeReadingFromItsTolerance() {
    Job job = Jobs.READER.read("job.yaml", Jobs.sampleText("receiver-blow-down"));
    assertInterval(45e5 + 1e5, Jobs.limits(job, "receiver").get(0).value().si());
    assertInterval(
        39.5e5 + 0.98e5,
        40e5 + 1e5,
        40.5e5 + 1.02e5,
        job.procedure().vessels().get(0).startPressure());
  }

  @ParameterizedTest
  @ValueSource(strings = {"receiver-top-up", "oxygen-ball-valve", "receiver-blow-down"})
  void readsTheSampleJobsFromTheirFiles(String name) {
    Job job = Jobs.READER.read(Path.of("sample-jobs", name + ".yaml"));

    assertEquals(Jobs.sampleText(name), job.text());
    assertTrue(job.limits().values().stream().noneMatch(List::isEmpty));
  }

  private static void assertInterval(double exact, Interval actual) {
    assertInterval(exact, exact, exact, actual);
  }

  private static void assertInterval(double low, double nominal, double high, Interval actual) {
    assertEquals(low, actual.low(), 1e-12 * Math.abs(low));
    assertEquals(nominal, actual.nominal(), 1e-12 * Math.abs(nominal));
    assertEquals(high, actual.high(), 1e-12 * Math.abs(high));
  }
}
