package org.gasmargin.process.bounds;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Drive;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.Vessel;
import org.jspecify.annotations.Nullable;

/** Carries the bounding paths and the reachable states of one vessel from step to step. */
public final class BoundTrack {
  private static final String EARLIER = "an earlier step left the validity of its model";

  private final Vessel vessel;
  private final Site site;
  private Optional<NodeSet> entries;
  private Optional<State> adiabatic;
  private Optional<State> isothermal;

  /**
   * Starts with the vessel as the job describes it.
   *
   * @throws OutsideValidity if the start state lies outside the range of the equation of state
   */
  public BoundTrack(Vessel vessel, Site site) {
    this.vessel = vessel;
    this.site = site;
    State nominal = start(vessel.startPressure().nominal(), vessel.startTemperature().nominal());
    this.entries = Optional.of(new NodeSet(startNodes(nominal), true));
    this.adiabatic = Optional.of(nominal);
    this.isothermal = Optional.of(nominal);
  }

  /** Temperatures that the wall and the ambient can have at the start of the job. */
  public Surroundings surroundings() {
    Interval ambient = site.ambientTemperature();
    Interval wall = vessel.startWallTemperature();
    return new Surroundings(ambient.low(), ambient.high())
        .including(wall.low())
        .including(wall.high());
  }

  /** Computes the bounds of the next step and moves on to its end. */
  public BoundStep advance(Step step, Surroundings surroundings) {
    StepPlan plan = new StepPlan(step, vessel, site);
    Map<PathKind, PathOutcome> paths = new EnumMap<>(PathKind.class);
    isothermal =
        isothermal.flatMap(start -> isothermalPath(plan, start, paths)).map(TimedPath.Result::end);
    Optional<State> before = adiabatic;
    Optional<TimedPath.Result> run = before.flatMap(start -> adiabaticPath(plan, start, paths));
    adiabatic = run.map(TimedPath.Result::end);
    paths.put(PathKind.UNMIXED, unmixed(plan, before, paths.get(PathKind.ADIABATIC)));
    paths.putIfAbsent(PathKind.ISOTHERMAL, new PathOutcome.Failed(EARLIER));
    paths.putIfAbsent(PathKind.ADIABATIC, new PathOutcome.Failed(EARLIER));
    Optional<Closure> closure =
        before.flatMap(start -> run.flatMap(result -> closure(plan, start, result)));

    Optional<StepBounds.Reach> reach =
        entries.map(nodes -> StepBounds.follow(plan, nodes, surroundings));
    entries = reach.flatMap(StepBounds.Reach::ends);
    return new BoundStep(
        paths,
        reach
            .map(StepBounds.Reach::envelope)
            .orElseGet(() -> BoundStep.unknownEnvelope(surroundings, EARLIER)),
        closure,
        entries.filter(NodeSet::complete).map(NodeSet::amount));
  }

  private Optional<TimedPath.Result> isothermalPath(
      StepPlan plan, State start, Map<PathKind, PathOutcome> paths) {
    double wall = vessel.startWallTemperature().nominal();
    return follow(PathKind.ISOTHERMAL, plan, new PathLaw.Isothermal(wall), start, paths);
  }

  private Optional<TimedPath.Result> adiabaticPath(
      StepPlan plan, State start, Map<PathKind, PathOutcome> paths) {
    try {
      return follow(PathKind.ADIABATIC, plan, plan.law(true), start, paths);
    } catch (OutsideValidity supply) {
      paths.put(PathKind.ADIABATIC, new PathOutcome.Failed(message(supply)));
      return Optional.empty();
    }
  }

  private static Optional<TimedPath.Result> follow(
      PathKind kind, StepPlan plan, PathLaw law, State start, Map<PathKind, PathOutcome> paths) {
    try {
      TimedPath.Result result = TimedPath.follow(plan, law, start);
      paths.put(kind, new PathOutcome.Computed(result.path()));
      return Optional.of(result);
    } catch (OutsideValidity failure) {
      paths.put(kind, new PathOutcome.Failed(message(failure)));
      return Optional.empty();
    }
  }

  /** The isentrope of the gas that is in the vessel when the step begins. */
  private static PathOutcome unmixed(
      StepPlan plan, Optional<State> start, @Nullable PathOutcome adiabatic) {
    if (!(plan.step() instanceof Step.Fill || plan.step() instanceof Step.Compress)) {
      return new PathOutcome.Absent("nothing is pushed ahead in a " + plan.step().kind());
    }
    if (start.isEmpty() || !(adiabatic instanceof PathOutcome.Computed mean)) {
      return new PathOutcome.Failed("the path without heat exchange is not known");
    }
    try {
      return new PathOutcome.Computed(UnmixedPath.follow(plan, start.get(), mean.path()));
    } catch (OutsideValidity failure) {
      return new PathOutcome.Failed(message(failure));
    }
  }

  private Optional<Closure> closure(StepPlan plan, State start, TimedPath.Result run) {
    State end = run.end();
    try {
      Gas gas = vessel.gas();
      PathLaw law = plan.law(true);
      if (plan.step() instanceof Step.Compress) {
        return Optional.of(PathClosure.compression(gas, start, end));
      }
      double flowed = flowed(plan, law, start, run);
      return Optional.of(
          law instanceof PathLaw.Charging charging
              ? PathClosure.charging(charging, start, end, flowed)
              : PathClosure.venting(gas, start, end, flowed));
    } catch (OutsideValidity unchecked) {
      return Optional.empty();
    }
  }

  /** Amount that the flow of the step brought in, apart from the end state, mol/m3. */
  private double flowed(StepPlan plan, PathLaw law, State start, TimedPath.Result run) {
    double perMass = 1 / (vessel.volume().nominal() * vessel.gas().molarMass());
    Optional<Drive> drive = plan.drive();
    if (drive.isEmpty()) {
      return 0;
    }
    if (drive.get() instanceof Drive.PressureRamp) {
      return PathClosure.flowedByPressure(vessel.gas(), law, start, run.end());
    }
    if (drive.get() instanceof Drive.MassFlow flow) {
      double sign = plan.step() instanceof Step.Fill ? 1 : -1;
      return sign * flow.massFlow().nominal() * flow.duration() * perMass;
    }
    return -run.discharged() * perMass;
  }

  private State start(double pressure, double temperature) {
    return vessel.gas().atTemperaturePressure(temperature, pressure);
  }

  /** The nominal start, and the corners of the tolerances of its pressure and temperature. */
  private List<Node> startNodes(State nominal) {
    List<Node> nodes = new ArrayList<>();
    nodes.add(new Node(nominal, ""));
    Interval pressure = vessel.startPressure();
    Interval temperature = vessel.startTemperature();
    for (double p : corners(pressure)) {
      for (double t : corners(temperature)) {
        if (p != pressure.nominal() || t != temperature.nominal()) {
          nodes.add(
              new Node(
                  start(p, t), "start at " + Words.pressure(p) + " and " + Words.temperature(t)));
        }
      }
    }
    return nodes;
  }

  private static double[] corners(Interval interval) {
    return interval.isExact()
        ? new double[] {interval.nominal()}
        : new double[] {interval.low(), interval.high()};
  }

  private static String message(OutsideValidity failure) {
    return String.valueOf(failure.getMessage());
  }
}
