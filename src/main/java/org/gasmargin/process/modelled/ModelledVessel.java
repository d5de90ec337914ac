package org.gasmargin.process.modelled;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.process.Closure;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.vessel.Correlation;
import org.gasmargin.vessel.FilmLaw;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.JetAndNaturalConvection;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.OutsideExchange;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallConduction;

/**
 * One vessel with its wall and surroundings, at one choice of the uncertain inputs: runs steps on
 * the modelled path. Immutable; the vessel's condition is handed from step to step.
 */
public final class ModelledVessel {
  /** Tolerance of the integrator: largest estimated relative error of a step. */
  static final double TOLERANCE = 1e-7;

  private final Vessel vessel;
  private final ModelInputs inputs;
  private final StepPlanner planner;
  private final double tolerance;
  private final Optional<WallSide> wallSide;

  /**
   * A vessel.
   *
   * @param vessel with or without a wall
   * @param site surroundings
   * @param inputs where within its tolerance each input is taken
   */
  public ModelledVessel(Vessel vessel, Site site, ModelInputs inputs) {
    this(vessel, site, inputs, TOLERANCE, 1);
  }

  /** A vessel with another tolerance and a finer wall, which shows convergence. */
  ModelledVessel(
      Vessel vessel, Site site, ModelInputs inputs, double tolerance, int wallRefinement) {
    this.vessel = vessel;
    this.inputs = inputs;
    this.tolerance = tolerance;
    double ambient = inputs.value(UncertainInput.AMBIENT_TEMPERATURE, site.ambientTemperature());
    double atmosphere =
        inputs.value(UncertainInput.ATMOSPHERIC_PRESSURE, site.atmosphericPressure());
    this.planner = new StepPlanner(vessel.gas(), inputs, atmosphere);
    this.wallSide = vessel.wall().map(wall -> wallSide(wall, ambient, atmosphere, wallRefinement));
  }

  private WallSide wallSide(Wall wall, double ambient, double atmosphere, int refinement) {
    WallConduction conduction = new WallConduction(wall, thicknesses(wall), refinement);
    double position = inputs.position(UncertainInput.FILM_OUTSIDE);
    return new WallSide(
        ambient,
        conduction,
        new OutsideExchange(wall, conduction.thickness(), ambient, atmosphere, position));
  }

  private double[] thicknesses(Wall wall) {
    return wall.layers().stream()
        .map(Layer::thickness)
        .mapToDouble(thickness -> inputs.value(UncertainInput.WALL_THICKNESS, thickness))
        .toArray();
  }

  /**
   * What the vessel holds at the start of the job.
   *
   * @throws OutsideValidity if the gas has no such state
   */
  public VesselCondition start() {
    double temperature = inputs.value(UncertainInput.START_TEMPERATURE, vessel.startTemperature());
    double pressure = inputs.value(UncertainInput.START_PRESSURE, vessel.startPressure());
    double volume = inputs.value(UncertainInput.VOLUME, vessel.volume());
    double wall =
        inputs.value(UncertainInput.START_WALL_TEMPERATURE, vessel.startWallTemperature());
    double density = vessel.gas().atTemperaturePressure(temperature, pressure).molarDensity();
    return new VesselCondition(
        volume,
        density * volume,
        temperature,
        Collections.nCopies(wallSide.map(side -> side.wall().cells()).orElse(0), wall));
  }

  /**
   * Runs one step.
   *
   * @param step the step
   * @param start what the vessel holds before it
   * @return the path, or why there is none; never throws {@link OutsideValidity}
   */
  public ModelledStep run(Step step, VesselCondition start) {
    if (wallSide.isEmpty()) {
      return ModelledStep.without(
          new PathOutcome.Absent("no wall was given, so heat exchange cannot be modelled"));
    }
    try {
      WallSide wall = wallSide.get().withDatum(start.wall().get(0));
      return run(planner.plan(step, start), start, wall);
    } catch (OutsideValidity refused) {
      return ModelledStep.without(new PathOutcome.Failed(String.valueOf(refused.getMessage())));
    }
  }

  private ModelledStep run(StepPlan plan, VesselCondition start, WallSide wall) {
    if (plan instanceof StepPlan.None none) {
      return ModelledStep.without(new PathOutcome.Absent(none.reason()));
    }
    if (plan instanceof StepPlan.Over over) {
      return standstill(start, wall, over.note());
    }
    if (plan instanceof StepPlan.Ramp ramp) {
      List<Phase> phases = new OneWayRamp(ramp, phaseRunner(wall)).run(vessel.gas(), start);
      FilmLaw film = film(ramp.flowing().from(start, ramp.ramp()).jetBore());
      ModelledStep step = result(new JoinedPhases(phases), film, ramp.direction() > 0);
      double endPressure = phases.get(phases.size() - 1).recorder().last().pressure();
      return step.withNote(OneWayRamp.note(ramp, endPressure));
    }
    StepPlan.Integration integration = (StepPlan.Integration) plan;
    Phase phase = phase(integration, start, 0, Optional.empty(), wall);
    return result(
        new JoinedPhases(List.of(phase)),
        film(integration.jetBore()),
        integration.carried() instanceof Carried.Supply);
  }

  private OneWayRamp.Runner phaseRunner(WallSide wall) {
    return new OneWayRamp.Runner() {
      @Override
      public double startRate(StepPlan.Integration integration, VesselCondition start) {
        GasWallSystem system = system(integration, film(integration.jetBore()), wall);
        double[] z = unknowns(system, integration, start);
        system.makeConsistent(z);
        double[] rates = new double[z.length];
        system.rates(0, z, rates);
        return rates[GasWallSystem.EXTENT];
      }

      @Override
      public Phase run(
          StepPlan.Integration integration,
          VesselCondition start,
          double begin,
          OneWayRamp.Turn turn) {
        return phase(integration, start, begin, Optional.of(turn), wall);
      }
    };
  }

  private static double[] unknowns(
      GasWallSystem system, StepPlan.Integration integration, VesselCondition start) {
    return system.unknowns(
        integration.startExtent(),
        start.temperature(),
        start.wall().stream().mapToDouble(Double::doubleValue).toArray());
  }

  private Phase phase(
      StepPlan.Integration integration,
      VesselCondition start,
      double begin,
      Optional<OneWayRamp.Turn> turn,
      WallSide wall) {
    GasWallSystem system = system(integration, film(integration.jetBore()), wall);
    Watches watches = new Watches(system, integration, turn);
    Trajectory trajectory =
        new ImplicitIntegrator(tolerance)
            .integrate(
                system,
                unknowns(system, integration, start),
                integration.duration(),
                watches.list());
    watches.check(trajectory);
    PathRecorder recorder = new PathRecorder(system);
    recorder.record(trajectory, watches.reached(trajectory));
    return new Phase(
        begin,
        system,
        trajectory,
        recorder,
        watches.events(trajectory, begin),
        watches.turned(trajectory));
  }

  private ModelledStep result(JoinedPhases phases, FilmLaw film, boolean fills) {
    FilmNotes range =
        film instanceof JetAndNaturalConvection correlation
            ? FilmNotes.of(correlation, phases.samples(), fills, vessel.gas().molarMass())
            : FilmNotes.NONE;
    return new ModelledStep(
        new PathOutcome.Computed(phases.path()),
        phases.last().recorder().end(),
        Optional.of(phases.closure()),
        phases.events(),
        range.notes(),
        range.extrapolated());
  }

  /** A step that is over before it starts: one point and the same condition. */
  private ModelledStep standstill(VesselCondition start, WallSide wall, String note) {
    StepPlan.Integration closed = StepPlanner.closed(start, 0);
    GasWallSystem system = system(closed, film(OptionalDouble.empty()), wall);
    double[] z = unknowns(system, closed, start);
    system.makeConsistent(z);
    PathRecorder recorder = new PathRecorder(system);
    recorder.recordInstant(z);
    return new ModelledStep(
        new PathOutcome.Computed(recorder.path()),
        Optional.of(start),
        Optional.of(new Closure(0, 0)),
        List.of(),
        List.of(note),
        false);
  }

  private GasWallSystem system(StepPlan.Integration plan, FilmLaw film, WallSide wall) {
    return new GasWallSystem(
        new GasSide(vessel.gas(), plan.content(), plan.carried(), plan.opening()),
        film,
        wall,
        plan.guard());
  }

  private FilmLaw film(OptionalDouble jetBore) {
    Wall wall = vessel.wall().orElseThrow();
    if (wall.inside() instanceof InsideFilm.Given given) {
      return new FilmLaw.Constant(inputs.value(UncertainInput.FILM_INSIDE, given.coefficient()));
    }
    double factor =
        1 + Correlation.JET_AND_NATURAL.uncertainty() * inputs.position(UncertainInput.FILM_INSIDE);
    return new JetAndNaturalConvection(vessel.gas(), wall.shape(), jetBore, factor);
  }
}
