package org.gasmargin.process.modelled;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.gasmargin.gas.OutsideValidity;

/**
 * Integrates a {@link StageSystem} with steps that keep the estimated error of each step within a
 * tolerance, and lands on the instants at which a watched function changes its sign.
 */
final class ImplicitIntegrator {
  private static final int MAX_STEPS = 20_000;
  private static final double SHORTEST = 1e-13;
  private static final double LONGEST = 1.0 / 48;

  private final double tolerance;

  /**
   * An integrator.
   *
   * @param tolerance largest estimated error of a step, relative
   */
  ImplicitIntegrator(double tolerance) {
    this.tolerance = tolerance;
  }

  /**
   * Integrates from time zero.
   *
   * @param system what is integrated
   * @param start unknowns at time zero
   * @param duration s, above zero
   * @param watches functions whose sign is watched
   * @throws OutsideValidity if a state leaves its validity or a step cannot be solved
   */
  Trajectory integrate(StageSystem system, double[] start, double duration, List<Watch> watches) {
    Run run = new Run(system, start, duration, watches);
    double step = run.firstStep();
    for (int count = 0; !run.finished(); count++) {
      if (count == MAX_STEPS) {
        throw new OutsideValidity(
            String.format(
                Locale.ROOT,
                "no end of the step within %d steps of the integration, at %.6g s of %.6g s",
                MAX_STEPS,
                run.time,
                duration));
      }
      step = run.advance(step);
    }
    return run.trajectory();
  }

  /**
   * Integrates with equal steps and without an estimate, which shows the order of the method.
   *
   * @throws OutsideValidity if a step cannot be solved
   */
  Trajectory integrateEvenly(StageSystem system, double[] start, double duration, int steps) {
    Run run = new Run(system, start, duration, List.of());
    for (int i = 1; i <= steps; i++) {
      double end = i == steps ? duration : duration * i / steps;
      run.accept(run.arrival(run.attempt(end - run.time).orElseThrow(run::refusal), end));
    }
    return run.trajectory();
  }

  /** One integration under way. */
  private final class Run {
    private final StageSystem system;
    private final double duration;
    private final List<Watch> watches;
    private final ImplicitStep stepper;
    private final List<DenseStep> steps = new ArrayList<>();
    private final List<Trajectory.Sighting> sightings = new ArrayList<>();
    private final double[] flows;
    private final double[] signs;
    private double time;
    private double[] z;
    private double[] rates;
    private double[] slopes;
    private boolean ended;

    Run(StageSystem system, double[] start, double duration, List<Watch> watches) {
      this.system = system;
      this.duration = duration;
      this.watches = watches;
      this.stepper = new ImplicitStep(system);
      this.flows = new double[system.flowCount()];
      this.z = start.clone();
      system.makeConsistent(z);
      this.rates = ratesAt(0, z);
      this.slopes = slopesAt(z, rates);
      system.check(0, z, rates);
      this.signs = new double[watches.size()];
      for (int i = 0; i < signs.length; i++) {
        signs[i] = Math.signum(watches.get(i).value().at(0, z));
      }
    }

    boolean finished() {
      return ended || time >= duration;
    }

    Trajectory trajectory() {
      return new Trajectory(List.copyOf(steps), flows, List.copyOf(sightings));
    }

    /** A first step over which no unknown changes by more than a small share. */
    double firstStep() {
      double fastest = 0;
      for (int i = 0; i < z.length; i++) {
        fastest = Math.max(fastest, Math.abs(slopes[i]) / system.magnitude(i, z));
      }
      double step = duration / 1000;
      return fastest > 0 ? Math.min(step, Math.cbrt(tolerance) / (10 * fastest)) : step;
    }

    /** Takes one step of at most the given length; gives the length to try next. */
    double advance(double proposed) {
      double step = Math.min(proposed, duration * LONGEST);
      while (true) {
        boolean last = time + step >= duration * (1 - SHORTEST);
        double length = last ? duration - time : step;
        Optional<ImplicitStep.Advance> advance = attempt(length);
        double error = advance.map(a -> a.error() / tolerance).orElse(Double.POSITIVE_INFINITY);
        if (error <= 1) {
          take(advance.orElseThrow(), length, last);
          return length * Math.min(3, 0.9 / Math.cbrt(Math.max(error, 1e-3)));
        }
        step = length * Math.max(0.2, 0.9 / Math.cbrt(error));
        if (step < duration * SHORTEST) {
          throw refusal();
        }
      }
    }

    Optional<ImplicitStep.Advance> attempt(double length) {
      return stepper.from(time, z, rates, length);
    }

    OutsideValidity refusal() {
      return new OutsideValidity(
          String.format(Locale.ROOT, "at %.6g s of the step: %s", time, stepper.failure()));
    }

    /** Accepts a step, or the part of it up to the first change of sign. */
    private void take(ImplicitStep.Advance advance, double length, boolean last) {
      double end = last ? duration : time + length;
      Arrival whole = arrival(advance, end);
      int first = -1;
      double earliest = end;
      double valueBehind = 0;
      for (int i = 0; i < signs.length; i++) {
        double after = watches.get(i).value().at(end, advance.z());
        if (after * signs[i] < 0) {
          double found = crossing(watches.get(i), signs[i], whole.step());
          if (first < 0 || found < earliest) {
            first = i;
            earliest = found;
            valueBehind = after;
          }
        }
      }
      if (first < 0) {
        accept(whole);
        return;
      }
      Watch watch = watches.get(first);
      accept(land(watch, signs[first], earliest - time, length, valueBehind));
      sightings.add(new Trajectory.Sighting(first, time));
      signs[first] = -signs[first];
      ended = watch.ends();
    }

    void accept(Arrival arrival) {
      steps.add(arrival.step());
      for (int i = 0; i < flows.length; i++) {
        flows[i] += arrival.flows()[i];
      }
      time = arrival.step().end();
      z = arrival.step().endUnknowns();
      rates = arrival.rates();
      slopes = arrival.step().endSlopes();
      system.check(time, z, rates);
    }

    Arrival arrival(ImplicitStep.Advance advance, double end) {
      double[] endRates = ratesAt(end, advance.z());
      double[] endSlopes = slopesAt(advance.z(), endRates);
      DenseStep step = new DenseStep(time, end, z, advance.z(), slopes, endSlopes);
      return new Arrival(step, endRates, advance.flows());
    }

    /** Bisects on the dense output; gives a time just behind the change of sign. */
    private double crossing(Watch watch, double sign, DenseStep step) {
      double before = step.start();
      double behind = step.end();
      while (behind - before > 1e-10 * (step.end() - step.start())) {
        double middle = 0.5 * (before + behind);
        if (watch.value().at(middle, step.at(middle)) * sign > 0) {
          before = middle;
        } else {
          behind = middle;
        }
      }
      return behind;
    }

    /** Takes shortened steps until the watched function is as near zero as it must be. */
    private Arrival land(Watch watch, double sign, double guess, double length, double endValue) {
      double before = 0;
      double valueBefore = watch.value().at(time, z);
      double behind = length;
      double valueBehind = endValue;
      double trial = guess;
      while (true) {
        ImplicitStep.Advance advance = attempt(trial).orElseThrow(this::refusal);
        double value = watch.value().at(time + trial, advance.z());
        boolean near = watch.precision() == 0 || Math.abs(value) <= watch.precision();
        if (near || behind - before <= 4 * Math.ulp(time + trial)) {
          return arrival(advance, time + trial);
        }
        if (value * sign > 0) {
          before = trial;
          valueBefore = value;
        } else {
          behind = trial;
          valueBehind = value;
        }
        double share = valueBefore / (valueBefore - valueBehind);
        boolean usable = share > 1e-3 && share < 1 - 1e-3;
        trial = before + (behind - before) * (usable ? share : 0.5);
      }
    }

    private double[] ratesAt(double at, double[] unknowns) {
      double[] result = new double[unknowns.length];
      system.rates(at, unknowns, result);
      return result;
    }

    private double[] slopesAt(double[] unknowns, double[] unknownRates) {
      double[] result = new double[unknowns.length];
      system.slopes(unknowns, unknownRates, result);
      return result;
    }
  }

  /** An accepted step, the rates at its end and what flowed in it. */
  @SuppressWarnings("ArrayRecordComponent") // never compared, never handed out of the package
  private record Arrival(DenseStep step, double[] rates, double[] flows) {}
}
