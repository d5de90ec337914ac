package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.process.Supply;
import org.gasmargin.process.simulation.Credit;
import org.gasmargin.process.simulation.Simulator;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.rules.Judgement;
import org.gasmargin.rules.Limit;
import org.gasmargin.rules.LimitKind;
import org.gasmargin.rules.NotApplied;
import org.gasmargin.rules.PackUsed;
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

/** A receiver that is filled, held and vented: simulated, with findings made for the page. */
final class SampleJob {
  static final double ATMOSPHERE = 1.013e5;
  static final double AMBIENT = 297.15;
  static final String HASH = "3f2a9c0d1e4b5a6788776655443322110f1e2d3c4b5a69788796a5b4c3d2e1f0";
  static final DisplayUnits UNITS =
      new DisplayUnits(
          Map.of(
              Dimension.ABSOLUTE_PRESSURE, Unit.BAR_GAUGE,
              Dimension.TEMPERATURE, Unit.DEGREE_CELSIUS),
          ATMOSPHERE);

  private static final ProcedureResult RESULT = new Simulator().simulate(procedure(), Credit.NONE);

  private SampleJob() {}

  static WorksheetContent content() {
    return with(steps(), SampleFindings.all(RESULT), JudgeOn.BOUNDS);
  }

  static WorksheetContent credited() {
    List<StepResult> steps = steps().stream().map(SampleJob::credited).toList();
    return with(steps, SampleFindings.all(RESULT), JudgeOn.MODELLED);
  }

  /** The paths of air in a vessel of another gas: for what the page says of the gas alone. */
  static WorksheetContent filledWith(String gas) {
    Procedure air = RESULT.procedure();
    Vessel vessel = air.vessels().get(0);
    Vessel other =
        new Vessel(
            vessel.name(),
            new GasCatalogue().find(gas).orElseThrow(),
            vessel.volume(),
            vessel.startPressure(),
            vessel.startTemperature(),
            vessel.startWallTemperature(),
            vessel.wall());
    WorksheetContent content = content();
    return new WorksheetContent(
        content.title(),
        content.number(),
        content.revision(),
        content.preparedBy(),
        new ProcedureResult(new Procedure(air.site(), List.of(other), air.steps()), steps()),
        content.limits(),
        content.judgement(),
        content.entries(),
        content.units(),
        content.inputsSha256(),
        content.programVersion());
  }

  static ProcedureResult result() {
    return RESULT;
  }

  static List<StepResult> steps() {
    return RESULT.steps();
  }

  static WorksheetContent with(List<StepResult> steps, List<Finding> findings, JudgeOn judgeOn) {
    return with("Top-up of a ring-main receiver", steps, findings, judgeOn);
  }

  static WorksheetContent with(
      String title, List<StepResult> steps, List<Finding> findings, JudgeOn judgeOn) {
    return new WorksheetContent(
        title,
        "J-0142",
        "A",
        "",
        new ProcedureResult(RESULT.procedure(), steps),
        Map.of("receiver", limits()),
        new Judgement(
            judgeOn,
            findings,
            List.of(
                new PackUsed("general", "ab".repeat(32), "asked for by the job"),
                new PackUsed("cylinder_fill", "cd".repeat(32), "asked for by the job")),
            List.of(
                new NotApplied("general.min_pressure", "1", "the job gives no min_pressure"),
                new NotApplied("general.min_pressure", "2", "the job gives no min_pressure"))),
        entries(),
        UNITS,
        HASH,
        "0.1.0");
  }

  static WorksheetContent titled(WorksheetContent content, String title, String preparedBy) {
    return new WorksheetContent(
        title,
        content.number(),
        content.revision(),
        preparedBy,
        content.result(),
        content.limits(),
        content.judgement(),
        content.entries(),
        content.units(),
        content.inputsSha256(),
        content.programVersion());
  }

  private static Procedure procedure() {
    Interval atTarget = Interval.exactly(200e5 + ATMOSPHERE);
    Interval standBy = Interval.exactly(10e5 + ATMOSPHERE);
    return new Procedure(
        new Site(Interval.around(AMBIENT, 4), Interval.exactly(ATMOSPHERE)),
        List.of(vessel()),
        List.of(
            new Step.Fill(
                "1",
                "receiver",
                new Supply("bank", Interval.exactly(301.013e5), Interval.around(AMBIENT, 4)),
                new Drive.PressureRamp(atTarget, 180),
                OptionalDouble.of(0.008)),
            new Step.Hold("2", "receiver", 1800),
            new Step.Vent(
                "3",
                "receiver",
                new Drive.Orifice(
                    Interval.exactly(0.003),
                    Interval.exactly(0.8),
                    Optional.of(standBy),
                    OptionalDouble.empty()))));
  }

  private static Vessel vessel() {
    Material steel =
        new Material(
            "cr_mo_steel",
            7850,
            List.of(new Material.Point(293.15, 42, 470)),
            "made up for tests (no source)");
    return new Vessel(
        "receiver",
        new GasCatalogue().find("air").orElseThrow(),
        Interval.around(0.05, 0.0005),
        Interval.around(12e5 + ATMOSPHERE, 1e5),
        Interval.exactly(AMBIENT),
        Interval.around(AMBIENT, 4),
        Optional.of(
            new Wall(
                new WallShape.Cylinder(0.229, 1.4, false),
                List.of(new Layer(steel, Interval.exactly(0.0058))),
                new InsideFilm.Correlation(),
                new OutsideFilm.StillAir())));
  }

  private static StepResult credited(StepResult step) {
    StepResult.Credited credited =
        new StepResult.Credited(
            340,
            250,
            200e5,
            10e5,
            OptionalDouble.of(306),
            OptionalDouble.of(280),
            "inside film coefficient ± 30 %, tolerances of the inputs at their worst");
    return new StepResult(
        step.step(),
        step.paths(),
        step.envelope(),
        Optional.of(credited),
        step.closure(),
        step.settledAmount(),
        step.events(),
        step.notes(),
        step.modelledCheckFailure());
  }

  private static List<Limit> limits() {
    return List.of(
        limit(LimitKind.MAX_PRESSURE, 200e5 + ATMOSPHERE, "200 bar(g)", "nameplate"),
        limit(LimitKind.MAX_GAS_TEMPERATURE, 338.15, "65 degC", "fill procedure 7.2"),
        limit(LimitKind.MIN_METAL_TEMPERATURE, 253.15, "-20 degC", "data sheet"));
  }

  private static Limit limit(LimitKind kind, double si, String typed, String readFrom) {
    Unit unit = kind.dimension() == Dimension.TEMPERATURE ? Unit.DEGREE_CELSIUS : Unit.BAR_GAUGE;
    return new Limit(
        kind,
        new Quantity(Interval.exactly(si), unit, typed),
        Optional.of(readFrom),
        OptionalDouble.empty());
  }

  private static List<Entry> entries() {
    String[][] rows = {
      {"site.ambient_temperature", "24 degC ± 4 K", ""},
      {"site.atmospheric_pressure", "1.013 bar(a)", ""},
      {"vessels.receiver.gas", "air", ""},
      {"vessels.receiver.volume", "50 L ± 1 %", ""},
      {"vessels.receiver.start.pressure", "12 bar(g) ± 1 bar", ""},
      {"vessels.receiver.wall.cylinder.length", "1.40 m", ""},
      {"vessels.receiver.limits.max_pressure", "200 bar(g)", "nameplate"},
      {"vessels.receiver.limits.max_gas_temperature", "65 degC", "fill procedure 7.2"},
      {"vessels.receiver.limits.min_metal_temperature", "-20 degC", "data sheet"},
      {"supplies.bank.temperature", "24 degC ± 4 K", ""},
      {"steps.1.fill.within", "3 min", ""},
      {"steps.3.vent.through.orifice", "3 mm", ""},
    };
    List<Entry> entries = new ArrayList<>();
    for (int i = 0; i < rows.length; i++) {
      Optional<String> readFrom = Optional.of(rows[i][2]).filter(text -> !text.isEmpty());
      Place place = new Place("receiver-top-up.yaml", i + 3, 14);
      entries.add(new Entry(rows[i][0], rows[i][1], readFrom, place));
    }
    return entries;
  }
}
