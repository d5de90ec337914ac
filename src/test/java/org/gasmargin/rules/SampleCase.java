package org.gasmargin.rules;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.process.Supply;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Interval;
import org.gasmargin.units.Quantity;
import org.gasmargin.units.Unit;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.Material;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;

/** A step with results made by hand, all of them sound; tests change one thing at a time. */
record SampleCase(
    Step step,
    Gas gas,
    double conductivity,
    StepResult result,
    List<Limit> limits,
    JudgeOn judgeOn) {
  static final double AMBIENT = 293.15;
  static final DisplayUnits UNITS =
      new DisplayUnits(
          Map.of(
              Dimension.ABSOLUTE_PRESSURE, Unit.BAR_ABSOLUTE,
              Dimension.TEMPERATURE, Unit.DEGREE_CELSIUS,
              Dimension.PRESSURE_RATE, Unit.BAR_PER_MINUTE),
          101_325);
  static final String VESSEL = "receiver";

  private static final GasCatalogue GASES = new GasCatalogue();
  private static final double STEEL = 42;
  private static final double POLYMER = 0.4;

  /** Oxygen, 10 to 150 bar(a) in 300 s, every limit given and kept, save that of ignition. */
  static SampleCase fill() {
    Supply supply = new Supply("bank", Interval.exactly(200e5), Interval.exactly(AMBIENT));
    Step fill =
        new Step.Fill(
            "1",
            VESSEL,
            supply,
            new Drive.PressureRamp(Interval.exactly(150e5), 300),
            OptionalDouble.empty());
    return new SampleCase(
        fill,
        gas("oxygen"),
        STEEL,
        result(fill, envelope(320, 290, 900)),
        allLimits(),
        JudgeOn.BOUNDS);
  }

  /** The same into a vessel with a polymer liner of which no limit was looked up. */
  static SampleCase linedFill() {
    SampleCase fill = fill();
    return new SampleCase(fill.step, fill.gas, POLYMER, fill.result, fill.limits, fill.judgeOn)
        .withoutLimit(LimitKind.MAX_METAL_TEMPERATURE);
  }

  /** Oxygen trapped in a dead leg, compressed from 1 to 150 bar(a). */
  static SampleCase deadLeg() {
    Step compress = new Step.Compress("1", VESSEL, Interval.exactly(150e5), 0.02);
    return new SampleCase(
        compress,
        gas("oxygen"),
        STEEL,
        result(compress, envelope(1098, AMBIENT, 1098)),
        allLimits(),
        JudgeOn.BOUNDS);
  }

  /** Nitrogen, 150 to 10 bar(a), with the cold end given. */
  static SampleCase vent(double coldest) {
    Step vent = new Step.Vent("1", VESSEL, new Drive.PressureRamp(Interval.exactly(10e5), 300));
    return new SampleCase(
        vent,
        gas("nitrogen"),
        STEEL,
        result(vent, withoutUnmixed(envelope(AMBIENT, coldest, 900))),
        allLimits(),
        JudgeOn.BOUNDS);
  }

  Judgement judge(List<RulePack> packs) {
    return Judge.judge(judgingCase(packs.stream().map(RulePack::name).toList()), packs);
  }

  JudgingCase judgingCase(List<String> requested) {
    Site site = new Site(Interval.exactly(AMBIENT), Interval.exactly(101_325));
    Procedure procedure = new Procedure(site, List.of(vessel()), List.of(step));
    return new JudgingCase(
        new ProcedureResult(procedure, List.of(result)),
        Map.of(VESSEL, limits),
        judgeOn,
        requested,
        UNITS);
  }

  SampleCase with(StepResult other) {
    return new SampleCase(step, gas, conductivity, other, limits, judgeOn);
  }

  SampleCase with(List<Limit> others) {
    return new SampleCase(step, gas, conductivity, result, others, judgeOn);
  }

  SampleCase with(Gas other) {
    return new SampleCase(step, other, conductivity, result, limits, judgeOn);
  }

  SampleCase on(JudgeOn other) {
    return new SampleCase(step, gas, conductivity, result, limits, other);
  }

  SampleCase withLimit(Limit limit) {
    List<Limit> others = limits.stream().filter(l -> l.kind() != limit.kind()).toList();
    return with(Stream.concat(others.stream(), Stream.of(limit)).toList());
  }

  SampleCase withoutLimit(LimitKind kind) {
    return with(limits.stream().filter(limit -> limit.kind() != kind).toList());
  }

  SampleCase with(Optional<Closure> closure) {
    return with(result(step, result.paths(), result.envelope(), result.credited(), closure));
  }

  SampleCase with(Envelope envelope) {
    return with(result(step, result.paths(), envelope, result.credited(), result.closure()));
  }

  SampleCase with(Map<PathKind, PathOutcome> paths) {
    return with(result(step, paths, result.envelope(), result.credited(), result.closure()));
  }

  SampleCase with(StepResult.Credited credited) {
    return with(
        result(step, result.paths(), result.envelope(), Optional.of(credited), result.closure()));
  }

  SampleCase with(StepResult.DensityRange amount) {
    return with(withAmount(Optional.of(amount), Optional.empty()));
  }

  /** The modelled path contradicts the bounds. */
  SampleCase contradicted(String reason) {
    return with(withAmount(result.settledAmount(), Optional.of(reason)));
  }

  /** Every path left the validity of its model, so that no extreme and no amount is known. */
  SampleCase outOfRange(String reason) {
    Envelope nothing =
        new Envelope(
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            AMBIENT,
            AMBIENT,
            List.of(reason));
    SampleCase lost =
        with(result(step, failed(reason), nothing, Optional.empty(), result.closure()));
    return lost.with(lost.withAmount(Optional.empty(), Optional.empty()));
  }

  /** Every path failed. */
  static Map<PathKind, PathOutcome> failed(String reason) {
    Map<PathKind, PathOutcome> failed = new EnumMap<>(PathKind.class);
    for (PathKind kind : PathKind.values()) {
      failed.put(kind, new PathOutcome.Failed(reason));
    }
    return failed;
  }

  private StepResult withAmount(
      Optional<StepResult.DensityRange> amount, Optional<String> contradiction) {
    return new StepResult(
        step,
        result.paths(),
        result.envelope(),
        result.credited(),
        result.closure(),
        amount,
        List.of(),
        List.of(),
        contradiction);
  }

  private static StepResult result(
      Step step,
      Map<PathKind, PathOutcome> paths,
      Envelope envelope,
      Optional<StepResult.Credited> credited,
      Optional<Closure> closure) {
    return new StepResult(
        step,
        paths,
        envelope,
        credited,
        closure,
        Optional.of(new StepResult.DensityRange(5000, 6000)),
        List.of(),
        List.of(),
        Optional.empty());
  }

  static Gas gas(String id) {
    return GASES.find(id).orElseThrow();
  }

  static Limit limit(LimitKind kind, double si) {
    return limit(kind, Interval.exactly(si), OptionalDouble.empty());
  }

  static Limit limit(LimitKind kind, Interval si, OptionalDouble margin) {
    return new Limit(
        kind, new Quantity(si, Unit.PASCAL_ABSOLUTE, "typed"), Optional.of("nameplate"), margin);
  }

  static StepResult.Credited credited(double highest, double lowest) {
    return new StepResult.Credited(
        highest,
        lowest,
        150e5,
        10e5,
        OptionalDouble.of(highest),
        OptionalDouble.of(lowest),
        "film ± 20 %");
  }

  private Vessel vessel() {
    Material material =
        new Material(
            "sample", 7850, List.of(new Material.Point(293.15, conductivity, 470)), "test data");
    Wall wall =
        new Wall(
            new WallShape.Plate(1),
            List.of(new Layer(material, Interval.exactly(0.006))),
            new InsideFilm.Correlation(),
            new OutsideFilm.StillAir());
    Interval ambient = Interval.exactly(AMBIENT);
    return new Vessel(
        VESSEL,
        gas,
        Interval.exactly(0.05),
        Interval.exactly(10e5),
        ambient,
        ambient,
        Optional.of(wall));
  }

  private static StepResult result(Step step, Envelope envelope) {
    Map<PathKind, PathOutcome> paths = new EnumMap<>(PathKind.class);
    for (PathKind kind : PathKind.values()) {
      paths.put(kind, new PathOutcome.Computed(path()));
    }
    return result(
        step,
        paths,
        envelope,
        Optional.of(credited(310, 292)),
        Optional.of(new Closure(1e-14, 1e-13)));
  }

  private static Envelope envelope(double hottest, double coldest, double unmixed) {
    return new Envelope(
        Optional.of(new Extreme(hottest, "fill without heat loss")),
        Optional.of(new Extreme(coldest, "start")),
        Optional.of(new Extreme(150e5, "fill")),
        Optional.of(new Extreme(10e5, "start")),
        Optional.of(new Extreme(unmixed, "pushed ahead")),
        AMBIENT,
        AMBIENT,
        List.of());
  }

  private static Envelope withoutUnmixed(Envelope envelope) {
    return new Envelope(
        envelope.highestGasTemperature(),
        envelope.lowestGasTemperature(),
        envelope.highestPressure(),
        envelope.lowestPressure(),
        Optional.empty(),
        AMBIENT,
        AMBIENT,
        List.of());
  }

  private static Path path() {
    OptionalDouble wall = OptionalDouble.of(AMBIENT);
    return new Path(
        List.of(
            new PathPoint(0, 10e5, AMBIENT, 0.6, 0.03, wall, wall),
            new PathPoint(300, 150e5, 310, 9, 0, wall, wall)),
        310,
        AMBIENT,
        150e5,
        10e5,
        wall,
        wall);
  }

  private static List<Limit> allLimits() {
    return Arrays.stream(LimitKind.values()).map(kind -> limit(kind, kept(kind))).toList();
  }

  private static double kept(LimitKind kind) {
    return switch (kind) {
      case MAX_PRESSURE -> 200e5;
      case MIN_PRESSURE -> 1e5;
      case TEST_PRESSURE -> 300e5;
      case WORKING_PRESSURE -> 200e5;
      case MAX_GAS_TEMPERATURE, MAX_METAL_TEMPERATURE -> 340;
      case MIN_GAS_TEMPERATURE, MIN_METAL_TEMPERATURE -> 230;
      case IGNITION_TEMPERATURE -> 532.15;
      case MAX_PRESSURE_RATE -> 35e5 / 60;
    };
  }
}
