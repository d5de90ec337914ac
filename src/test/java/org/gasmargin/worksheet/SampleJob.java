package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Event;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.process.Supply;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.rules.Judgement;
import org.gasmargin.rules.Limit;
import org.gasmargin.rules.LimitKind;
import org.gasmargin.rules.PackUsed;
import org.gasmargin.rules.Severity;
import org.gasmargin.rules.Verdict;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Entry;
import org.gasmargin.units.Interval;
import org.gasmargin.units.Place;
import org.gasmargin.units.Quantity;
import org.gasmargin.units.Unit;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.Material;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;

/** A receiver that is filled, held and vented, with closed-form paths: content for pages only. */
final class SampleJob {
  static final double ATMOSPHERE = 1.013e5;
  static final double AMBIENT = 297.15;
  static final DisplayUnits UNITS =
      new DisplayUnits(
          Map.of(
              Dimension.ABSOLUTE_PRESSURE, Unit.BAR_GAUGE,
              Dimension.TEMPERATURE, Unit.DEGREE_CELSIUS),
          ATMOSPHERE);

  private static final double VOLUME = 0.05;
  private static final double START = 12e5 + ATMOSPHERE;
  private static final double FULL = 200e5 + ATMOSPHERE;
  private static final double LEFT = 10e5 + ATMOSPHERE;
  private static final double HOT_SUPPLY = AMBIENT + 4;

  private SampleJob() {}

  static WorksheetContent content() {
    return withFindings(findings(), JudgeOn.BOUNDS);
  }

  static WorksheetContent withFindings(List<Finding> findings, JudgeOn judgeOn) {
    return with("Top-up of a ring-main receiver", steps(), findings, judgeOn);
  }

  static WorksheetContent with(
      String title, List<StepResult> steps, List<Finding> findings, JudgeOn judgeOn) {
    Procedure procedure =
        new Procedure(
            new Site(Interval.around(AMBIENT, 4), Interval.exactly(ATMOSPHERE)),
            List.of(vessel()),
            steps.stream().map(StepResult::step).toList());
    return new WorksheetContent(
        title,
        "J-0142",
        "A",
        "",
        new ProcedureResult(procedure, steps),
        Map.of("receiver", limits()),
        new Judgement(
            judgeOn,
            findings,
            List.of(
                new PackUsed("general", "ab".repeat(32), "asked for by the job"),
                new PackUsed("cylinder_fill", "cd".repeat(32), "asked for by the job")),
            List.of()),
        entries(),
        UNITS,
        "3f2a9c0d1e4b5a6788776655443322110f1e2d3c4b5a69788796a5b4c3d2e1f0",
        "0.1.0");
  }

  static Vessel vessel() {
    Material steel =
        new Material(
            "cr_mo_steel",
            7850,
            List.of(new Material.Point(293.15, 42, 470)),
            "Test data, no source");
    return new Vessel(
        "receiver",
        ConstantCpGas.AIR,
        Interval.around(VOLUME, VOLUME * 0.01),
        Interval.around(START, 1e5),
        Interval.exactly(AMBIENT),
        Interval.around(AMBIENT, 4),
        Optional.of(
            new Wall(
                new WallShape.Cylinder(0.229, 1.4, false),
                List.of(new Layer(steel, Interval.exactly(0.0058))),
                new InsideFilm.Correlation(),
                new OutsideFilm.StillAir())));
  }

  private static List<Limit> limits() {
    return List.of(
        limit(LimitKind.MAX_PRESSURE, FULL, "200 bar(g)", Unit.BAR_GAUGE, "nameplate"),
        limit(
            LimitKind.MAX_GAS_TEMPERATURE,
            338.15,
            "65 degC",
            Unit.DEGREE_CELSIUS,
            "fill procedure 7.2"),
        limit(
            LimitKind.MIN_METAL_TEMPERATURE,
            253.15,
            "-20 degC",
            Unit.DEGREE_CELSIUS,
            "data sheet"));
  }

  private static Limit limit(LimitKind kind, double si, String typed, Unit unit, String readFrom) {
    return new Limit(
        kind,
        new Quantity(Interval.exactly(si), unit, typed),
        Optional.of(readFrom),
        OptionalDouble.empty());
  }

  static List<StepResult> steps() {
    SamplePaths paths = new SamplePaths(ConstantCpGas.AIR, VOLUME);
    DoubleUnaryOperator hot = paths.charge(START, AMBIENT, HOT_SUPPLY);
    DoubleUnaryOperator even = p -> AMBIENT;
    double hotEnd = hot.applyAsDouble(FULL);
    double settled = FULL * AMBIENT / hotEnd;
    double modelledEnd = AMBIENT + 0.35 * (hotEnd - AMBIENT);
    Step fill =
        new Step.Fill(
            "1",
            "receiver",
            new Supply("bank", Interval.exactly(301.013e5), Interval.around(AMBIENT, 4)),
            new Drive.PressureRamp(Interval.exactly(FULL), 180),
            OptionalDouble.empty());
    StepResult filled =
        step(
            fill,
            Map.of(
                PathKind.ADIABATIC,
                computed(paths.ramp(START, FULL, 180, hot)),
                PathKind.ISOTHERMAL,
                computed(paths.ramp(START, FULL, 180, even)),
                PathKind.MODELLED,
                computed(
                    paths.rampWithWall(
                        START, FULL, 180, SamplePaths.between(even, hot, 0.35), AMBIENT, 7.4)),
                PathKind.UNMIXED,
                computed(paths.ramp(START, FULL, 180, paths.isentrope(START, AMBIENT)))),
            envelope(
                new Extreme(hotEnd, "fill without heat loss"),
                new Extreme(AMBIENT - 4, "settled to 20 degC"),
                new Extreme(FULL, "fill without heat loss"),
                new Extreme(START - 1e5, "start at 12 bar(a) and 24 degC")),
            List.of(new Event(96.4, PathKind.ADIABATIC, "gas temperature passes 65 degC")));
    StepResult held =
        step(
            new Step.Hold("2", "receiver", 1800),
            Map.of(
                PathKind.ADIABATIC,
                computed(paths.ramp(FULL, FULL, 1800, p -> hotEnd)),
                PathKind.ISOTHERMAL,
                computed(paths.ramp(FULL, FULL, 1800, even)),
                PathKind.MODELLED,
                computed(paths.settle(FULL, modelledEnd, AMBIENT + 1, 1800, AMBIENT)),
                PathKind.UNMIXED,
                new PathOutcome.Absent("nothing is pushed ahead in a hold")),
            envelope(
                new Extreme(hotEnd, "fill without heat loss"),
                new Extreme(AMBIENT - 4, "fill without heat loss, then settled to 20 degC"),
                new Extreme(FULL * 1.013, "fill with gas kept at 20 degC, then settled to 28 degC"),
                new Extreme(settled, "fill without heat loss, then settled to 20 degC")),
            List.of());
    DoubleUnaryOperator cold = paths.isentrope(FULL, hotEnd);
    StepResult vented =
        step(
            new Step.Vent(
                "3",
                "receiver",
                new Drive.Orifice(
                    Interval.exactly(0.003),
                    Interval.exactly(0.8),
                    Optional.of(Interval.exactly(LEFT)),
                    OptionalDouble.empty())),
            Map.of(
                PathKind.ADIABATIC,
                computed(paths.ramp(FULL, LEFT, 118, cold)),
                PathKind.ISOTHERMAL,
                computed(paths.ramp(FULL, LEFT, 156, even)),
                PathKind.MODELLED,
                computed(
                    paths.rampWithWall(
                        settled,
                        LEFT,
                        131,
                        SamplePaths.between(even, paths.isentrope(settled, AMBIENT), 0.3),
                        AMBIENT,
                        -9.1)),
                PathKind.UNMIXED,
                new PathOutcome.Absent("nothing is pushed ahead in a vent")),
            envelope(
                new Extreme(hotEnd, "fill without heat loss"),
                new Extreme(
                    paths.isentrope(settled, AMBIENT - 4).applyAsDouble(LEFT),
                    "fill without heat loss, then settled to 20 degC, then vent without heat gain"),
                new Extreme(FULL * 1.013, "fill with gas kept at 20 degC, then settled to 28 degC"),
                new Extreme(LEFT, "vent without heat gain")),
            List.of());
    return List.of(filled, held, vented);
  }

  static PathOutcome computed(org.gasmargin.process.Path path) {
    return new PathOutcome.Computed(path);
  }

  static StepResult step(
      Step step, Map<PathKind, PathOutcome> paths, Envelope envelope, List<Event> events) {
    return new StepResult(
        step,
        paths,
        envelope,
        Optional.of(
            new StepResult.Credited(
                340,
                280,
                FULL,
                START,
                OptionalDouble.of(306),
                OptionalDouble.of(290),
                "inside film coefficient ± 30 %, tolerances of the inputs at their worst")),
        Optional.of(new Closure(3.2e-15, 4.7e-11)),
        Optional.empty(),
        events,
        List.of(),
        Optional.empty());
  }

  private static Envelope envelope(Extreme high, Extreme low, Extreme highP, Extreme lowP) {
    return new Envelope(
        Optional.of(high),
        Optional.of(low),
        Optional.of(highP),
        Optional.of(lowP),
        Optional.of(new Extreme(668.4, "pushed ahead without mixing or heat loss")),
        AMBIENT + 4,
        AMBIENT - 4,
        List.of());
  }

  static List<Finding> findings() {
    List<Finding> findings = new ArrayList<>();
    SamplePaths paths = new SamplePaths(ConstantCpGas.AIR, VOLUME);
    double hot = paths.charge(START, AMBIENT, HOT_SUPPLY).applyAsDouble(FULL);
    for (String id : List.of("1", "2")) {
      findings.add(
          finding(
              "general.max_gas_temperature",
              "Gas temperature",
              id,
              Verdict.OVER_LIMIT,
              Dimension.TEMPERATURE,
              hot,
              338.15,
              "fill procedure 7.2",
              338.15 - hot,
              5));
    }
    findings.add(
        finding(
            "general.min_metal_temperature",
            "Metal temperature, cold end",
            "3",
            Verdict.OVER_LIMIT,
            Dimension.TEMPERATURE,
            145.2,
            253.15,
            "data sheet",
            145.2 - 253.15,
            5));
    findings.add(
        finding(
            "general.max_pressure",
            "Pressure",
            "2",
            Verdict.OVER_LIMIT,
            Dimension.ABSOLUTE_PRESSURE,
            FULL * 1.013,
            FULL,
            "nameplate",
            -FULL * 0.013,
            0));
    findings.add(
        finding(
            "general.max_pressure",
            "Pressure",
            "1",
            Verdict.MARGIN_SHORT,
            Dimension.ABSOLUTE_PRESSURE,
            FULL,
            FULL,
            "nameplate",
            0,
            4e5));
    findings.add(
        finding(
            "cylinder_fill.settled_content",
            "Settled pressure",
            "2",
            Verdict.WITHIN_LIMITS,
            Dimension.ABSOLUTE_PRESSURE,
            147.6e5,
            140e5,
            "rule's default",
            7.6e5,
            2e5));
    findings.add(
        new Finding(
            "general.max_metal_temperature",
            "Metal temperature, hot end",
            "1",
            "receiver",
            Verdict.NOT_ASSESSED,
            Severity.DAMAGE,
            "highest metal temperature",
            Dimension.TEMPERATURE,
            OptionalDouble.of(hot),
            OptionalDouble.empty(),
            Optional.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            "fill without heat loss",
            "the job gives no max_metal_temperature; look it up on the nameplate or the data sheet",
            "A limit that nobody wrote down protects nobody.",
            "Pressure equipment practice",
            "common practice, no source"));
    return findings;
  }

  static Finding finding(
      String rule,
      String title,
      String step,
      Verdict verdict,
      Dimension dimension,
      double predicted,
      double limit,
      String origin,
      double margin,
      double required) {
    return new Finding(
        rule,
        title,
        step,
        "receiver",
        verdict,
        Severity.DAMAGE,
        "furthest " + title.toLowerCase(java.util.Locale.ROOT) + " of the step",
        dimension,
        OptionalDouble.of(predicted),
        OptionalDouble.of(limit),
        Optional.of(origin),
        OptionalDouble.of(margin),
        OptionalDouble.of(required),
        "fill without heat loss",
        title
            + " reaches "
            + UNITS.format(predicted, dimension)
            + " against a limit of "
            + UNITS.format(limit, dimension),
        dimension == Dimension.TEMPERATURE
            ? "A hot cylinder at the right pressure is not full; a cold one may be overfull when it"
                + " warms."
            : "Never exceed a marked pressure because a calculation allows it.",
        "Gas cylinder filling practice; check the edition in force",
        "common practice, no source");
  }

  private static List<Entry> entries() {
    List<Entry> entries = new ArrayList<>();
    String[][] rows = {
      {"site.ambient_temperature", "24 degC ± 4 K", ""},
      {"site.atmospheric_pressure", "1.013 bar(a)", ""},
      {"vessels.receiver.gas", "air", ""},
      {"vessels.receiver.volume", "50 L ± 1 %", ""},
      {"vessels.receiver.start.pressure", "12 bar(g) ± 1 bar", ""},
      {"vessels.receiver.start.temperature", "24 degC", ""},
      {"vessels.receiver.wall.cylinder.inner_diameter", "229 mm", ""},
      {"vessels.receiver.wall.cylinder.length", "1.40 m", ""},
      {"vessels.receiver.wall.layers.0.thickness", "5.8 mm", ""},
      {"vessels.receiver.limits.max_pressure", "200 bar(g)", "nameplate"},
      {"vessels.receiver.limits.max_gas_temperature", "65 degC", "fill procedure 7.2"},
      {"vessels.receiver.limits.min_metal_temperature", "-20 degC", "data sheet"},
      {"supplies.bank.pressure", "300 bar(g)", ""},
      {"supplies.bank.temperature", "24 degC ± 4 K", ""},
      {"steps.1.fill.until", "200 bar(g)", ""},
      {"steps.1.fill.within", "3 min", ""},
      {"steps.2.hold.for", "30 min", ""},
      {"steps.3.vent.through.orifice", "3 mm", ""},
      {"steps.3.vent.until", "10 bar(g)", ""},
    };
    for (int i = 0; i < rows.length; i++) {
      entries.add(
          new Entry(
              rows[i][0],
              rows[i][1],
              rows[i][2].isEmpty() ? Optional.empty() : Optional.of(rows[i][2]),
              new Place("receiver-top-up.yaml", i + 3, 14)));
    }
    return entries;
  }
}
