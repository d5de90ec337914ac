package org.gasmargin.process.modelled;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.process.Event;
import org.gasmargin.process.PathKind;

/** What is watched during the integration of a step, and the events that come of it. */
final class Watches {
  /** How near the end pressure must be met, relative. */
  private static final double PRESSURE_PRECISION = 1e-12;

  private final List<Watch> watches = new ArrayList<>();
  private final List<String> words = new ArrayList<>();
  private final StepPlan.Integration plan;
  private final boolean turnWatched;

  Watches(GasWallSystem system, StepPlan.Integration plan, Optional<OneWayRamp.Turn> turn) {
    this.plan = plan;
    turn.ifPresent(
        watched -> {
          watches.add(watched.watch().of(system));
          words.add(watched.words());
        });
    this.turnWatched = turn.isPresent();
    plan.endPressure()
        .ifPresent(
            end -> {
              watches.add(
                  new Watch(
                      (time, z) -> system.gas(z).pressure() / end - 1, PRESSURE_PRECISION, true));
              words.add("end pressure reached");
            });
    plan.choked()
        .ifPresent(
            choked -> {
              watches.add(new Watch((time, z) -> choked.at(system.gas(z)) ? 1 : -1, 0, false));
              words.add("flow through the orifice is no longer choked");
            });
  }

  List<Watch> list() {
    return List.copyOf(watches);
  }

  /**
   * The events in words.
   *
   * @param begin time since the start of the step at which the integration began, s
   */
  List<Event> events(Trajectory trajectory, double begin) {
    return trajectory.sightings().stream()
        .map(s -> new Event(begin + s.time(), PathKind.MODELLED, words.get(s.watch())))
        .toList();
  }

  /** Whether the turn that was watched for ended the integration. */
  boolean turned(Trajectory trajectory) {
    return turnWatched && trajectory.sightings().stream().anyMatch(s -> s.watch() == 0);
  }

  /** The pressure at which the step ended, if an end pressure was reached. */
  OptionalDouble reached(Trajectory trajectory) {
    boolean ended = trajectory.sightings().stream().anyMatch(s -> watches.get(s.watch()).ends());
    return ended ? plan.endPressure() : OptionalDouble.empty();
  }

  /**
   * Refuses a step that did not reach what it must.
   *
   * @throws OutsideValidity with the reason
   */
  void check(Trajectory trajectory) {
    if (plan.mustReach() && reached(trajectory).isEmpty()) {
      throw new OutsideValidity(
          String.format(
              Locale.ROOT,
              "the end pressure of %.6g bar(a) was not reached within %.4g s",
              plan.endPressure().orElse(Double.NaN) / 1e5,
              plan.duration()));
    }
  }
}
