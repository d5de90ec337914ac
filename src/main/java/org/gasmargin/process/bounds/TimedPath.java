package org.gasmargin.process.bounds;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.gasmargin.flow.Orifice;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Step;
import org.gasmargin.units.Interval;

/**
 * The isothermal and the adiabatic path of a step in time, with the nominal inputs (and, without
 * heat exchange, the hottest supply).
 */
final class TimedPath {
  private static final int INTERVALS = 240;

  private final StepPlan plan;
  private final Course course;
  private final List<State> states = new ArrayList<>();
  private final List<PathPoint> points = new ArrayList<>();
  private final OptionalDouble wall;
  private double discharged;

  private TimedPath(StepPlan plan, PathLaw law) {
    this.plan = plan;
    this.course = new Course(plan.vessel().gas(), law, plan.coordinate(), Exchange.NONE);
    this.wall =
        law instanceof PathLaw.Isothermal isothermal && plan.vessel().wall().isPresent()
            ? OptionalDouble.of(isothermal.temperature())
            : OptionalDouble.empty();
  }

  /**
   * A path and the state in which it ends.
   *
   * @param path the path in time
   * @param end the state at its end
   * @param discharged mass that left through an orifice, integrated apart from the density, kg;
   *     zero for every other drive
   */
  record Result(Path path, State end, double discharged) {}

  /**
   * Follows a law through the step.
   *
   * @throws OutsideValidity if the path leaves the validity of its models
   */
  static Result follow(StepPlan plan, PathLaw law, State entry) {
    TimedPath path = new TimedPath(plan, law);
    path.add(0, entry, 0);
    State start = entry;
    if (law instanceof PathLaw.Isothermal isothermal
        && isothermal.temperature() != entry.temperature()) {
      start = plan.vessel().gas().at(isothermal.temperature(), entry.molarDensity());
      path.add(0, start, 0);
    }
    path.run(start);
    return path.result();
  }

  private void run(State start) {
    if (plan.step() instanceof Step.Hold hold) {
      for (int i = 1; i <= INTERVALS; i++) {
        add(hold.duration() * i / INTERVALS, start, 0);
      }
    } else if (plan.step() instanceof Step.Compress compress) {
      ramp(start, compress.until().nominal(), compress.within());
    } else {
      Drive drive = plan.drive().orElseThrow();
      if (drive instanceof Drive.PressureRamp ramp) {
        ramp(start, ramp.until().nominal(), ramp.within());
      } else if (drive instanceof Drive.MassFlow flow) {
        constantFlow(start, flow);
      } else if (drive instanceof Drive.Orifice orifice) {
        discharge(start, orifice);
      }
    }
  }

  private void ramp(State start, double until, double within) {
    boolean rises = !(plan.step() instanceof Step.Vent);
    if (rises ? start.pressure() >= until : start.pressure() <= until) {
      return;
    }
    double rate = (until - start.pressure()) / within;
    State state = start;
    for (int i = 1; i <= INTERVALS; i++) {
      double part = i / (double) INTERVALS;
      double pressure =
          i == INTERVALS ? until : start.pressure() + part * (until - start.pressure());
      state = course.advance(state, pressure);
      boolean closed = plan.step() instanceof Step.Compress;
      double flow =
          closed || within == 0
              ? 0
              : rate * course.law().densityPerPressure(state) * kilogramsPerMolarDensity();
      add(part * within, state, flow);
    }
  }

  private void constantFlow(State start, Drive.MassFlow flow) {
    double sign = plan.step() instanceof Step.Fill ? 1 : -1;
    double massFlow = sign * flow.massFlow().nominal();
    double change = massFlow * flow.duration() / kilogramsPerMolarDensity();
    State state = start;
    for (int i = 1; i <= INTERVALS; i++) {
      double part = i / (double) INTERVALS;
      double density = start.molarDensity() + part * change;
      if (!(density > 0)) {
        throw new OutsideValidity("the vessel is empty before the step ends");
      }
      state = course.advance(state, density);
      if (sign < 0 && state.pressure() < plan.site().atmosphericPressure().nominal()) {
        throw new OutsideValidity(
            "the vessel reaches atmospheric pressure before the step ends, so the mass flow that"
                + " the job gives cannot last");
      }
      add(part * flow.duration(), state, massFlow);
    }
  }

  private void discharge(State start, Drive.Orifice orifice) {
    double atmosphere = plan.site().atmosphericPressure().nominal();
    double stop = orifice.until().map(Interval::nominal).orElse(atmosphere);
    if (start.pressure() <= stop) {
      return;
    }
    Orifice hole =
        new Orifice(orifice.diameter().nominal(), orifice.dischargeCoefficient().nominal());
    Course byDensity =
        new Course(course.gas(), course.law(), Coordinate.DENSITY, course.exchange());
    OrificeDischarge discharge =
        new OrificeDischarge(byDensity, start, hole, plan.vessel().volume().nominal(), atmosphere);
    OrificeDischarge.History history =
        discharge.until(stop, orifice.duration().orElse(Double.POSITIVE_INFINITY));
    for (int i = 1; i <= INTERVALS; i++) {
      double time = history.duration() * i / INTERVALS;
      State state = discharge.stateAt(history.densityAt(time));
      add(time, state, -discharge.flow(state).massFlow());
    }
    discharged = history.discharged();
    if (orifice.duration().isPresent()
        && history.duration() < orifice.duration().getAsDouble()
        && orifice.until().isEmpty()) {
      add(orifice.duration().getAsDouble(), states.get(states.size() - 1), 0);
    }
  }

  /** Mass in the vessel per molar density, kg m3/mol. */
  private double kilogramsPerMolarDensity() {
    return plan.vessel().volume().nominal() * plan.vessel().gas().molarMass();
  }

  private void add(double time, State state, double massFlow) {
    double density =
        plan.step() instanceof Step.Compress && !states.isEmpty()
            ? states.get(0).molarDensity()
            : state.molarDensity();
    states.add(state);
    points.add(
        new PathPoint(
            time,
            state.pressure(),
            state.temperature(),
            density * kilogramsPerMolarDensity(),
            massFlow,
            wall,
            wall));
  }

  private Result result() {
    return new Result(
        new Path(
            points,
            states.stream().mapToDouble(State::temperature).max().orElseThrow(),
            states.stream().mapToDouble(State::temperature).min().orElseThrow(),
            states.stream().mapToDouble(State::pressure).max().orElseThrow(),
            states.stream().mapToDouble(State::pressure).min().orElseThrow(),
            wall,
            wall),
        states.get(states.size() - 1),
        discharged);
  }
}
