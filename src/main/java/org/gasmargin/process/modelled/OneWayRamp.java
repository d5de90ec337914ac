package org.gasmargin.process.modelled;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;

/**
 * A pressure ramp through a valve that lets gas pass one way only. While heat exchange alone keeps
 * the pressure ahead of the ramp the valve is shut and the pressure is that of a closed vessel;
 * when the ramp has caught up, gas flows again.
 *
 * @param plan the ramp
 * @param runner integrates one phase
 */
record OneWayRamp(StepPlan.Ramp plan, Runner runner) {
  private static final int MOST_PHASES = 100;

  /** A reversal, or a lead over the ramp, that is smaller than this share is round-off. */
  private static final double IDLE = 1e-9;

  private static final double RATE_PRECISION = 1e-8;
  private static final double PRESSURE_PRECISION = 1e-11;

  /** Integrates phases. */
  interface Runner {
    /**
     * The rate of the extent at the start of an integration.
     *
     * @param integration what there is to integrate
     * @param start condition at its start
     */
    double startRate(StepPlan.Integration integration, VesselCondition start);

    /**
     * Runs from a condition.
     *
     * @param integration what there is to integrate
     * @param start condition at the start of the phase
     * @param begin time since the start of the step, s
     * @param turn what ends the phase early
     */
    Phase run(StepPlan.Integration integration, VesselCondition start, double begin, Turn turn);
  }

  /**
   * Something that ends a phase early.
   *
   * @param watch its sign, for a system
   * @param words what happens then
   */
  record Turn(WatchOf watch, String words) {}

  /** A watch on a system. */
  @FunctionalInterface
  interface WatchOf {
    /** The watch. */
    Watch of(GasWallSystem system);
  }

  /** Runs the whole ramp. */
  List<Phase> run(Gas gas, VesselCondition start) {
    List<Phase> phases = new ArrayList<>();
    VesselCondition condition = start;
    double time = 0;
    double within = plan.ramp().duration();
    while (within - time > IDLE * within) {
      if (phases.size() >= MOST_PHASES) {
        throw new OutsideValidity("the valve of a ramp opens and shuts without end");
      }
      double pressure = gas.at(condition.temperature(), condition.molarDensity()).pressure();
      Optional<Phase> flowing = flowing(condition, pressure, time, within - time);
      Phase phase = flowing.isPresent() ? flowing.get() : shut(condition, time, within - time);
      phases.add(phase);
      condition = phase.recorder().end().orElseThrow();
      time = phase.turned() ? phase.end() : within;
    }
    return phases;
  }

  /** The ramp from here on; empty if gas would have to flow backwards at once. */
  private Optional<Phase> flowing(
      VesselCondition condition, double pressure, double begin, double remaining) {
    double target = plan.ramp().to();
    if ((target - pressure) * plan.direction() <= 0) {
      return Optional.empty();
    }
    Opening.Ramp rest = new Opening.Ramp(pressure, target, remaining);
    double scale = condition.amount() / plan.ramp().duration();
    Turn turn =
        new Turn(
            system ->
                new Watch(
                    (time, z) -> plan.direction() * rate(system, time, z) / scale + IDLE,
                    RATE_PRECISION,
                    true),
            "the valve shuts: heat exchange alone moves the pressure ahead of the ramp");
    StepPlan.Integration integration = plan.flowing().from(condition, rest);
    return plan.direction() * runner.startRate(integration, condition) > -0.5 * IDLE * scale
        ? Optional.of(runner.run(integration, condition, begin, turn))
        : Optional.empty();
  }

  private Phase shut(VesselCondition condition, double begin, double remaining) {
    Turn turn =
        new Turn(
            system ->
                new Watch(
                    (time, z) -> {
                      double p = system.gas(z).pressure();
                      double lead = p - plan.ramp().pressure(begin + time);
                      return plan.direction() * lead / p + IDLE;
                    },
                    PRESSURE_PRECISION,
                    true),
            "the valve opens again: the ramp has caught up with the pressure");
    return runner.run(StepPlanner.closed(condition, remaining), condition, begin, turn);
  }

  private static double rate(GasWallSystem system, double time, double[] z) {
    double[] rates = new double[z.length];
    system.rates(time, z, rates);
    return rates[GasWallSystem.EXTENT];
  }

  /** What to tell of a ramp that heat exchange overtook, if it did not end at its target. */
  static Optional<String> note(StepPlan.Ramp plan, double endPressure) {
    double target = plan.ramp().to();
    return Math.abs(endPressure - target) <= 1e-6 * target
        ? Optional.empty()
        : Optional.of(
            String.format(
                Locale.ROOT,
                "heat exchange alone moves the pressure past the ramp: it ends at %.6g bar(a)"
                    + " instead of %.6g bar(a)",
                endPressure / 1e5,
                target / 1e5));
  }
}
