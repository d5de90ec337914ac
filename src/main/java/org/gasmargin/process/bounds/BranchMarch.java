package org.gasmargin.process.bounds;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.process.Step;

/** Follows a course from an entry state to its ends. */
final class BranchMarch {
  private static final int STEPS_TO_NEAR = 48;
  private static final int STEPS_TO_FAR = 8;

  private final StepPlan plan;
  private final Course course;
  private final List<State> states = new ArrayList<>();
  private final List<State> ends = new ArrayList<>();
  private boolean clipped;
  private boolean free;

  private BranchMarch(StepPlan plan, Course course) {
    this.plan = plan;
    this.course = course;
  }

  /** The branch that enters the step at {@code entry} and follows {@code course}. */
  static Branch follow(StepPlan plan, Course course, State entry) {
    BranchMarch march = new BranchMarch(plan, course);
    String settled = "";
    try {
      march.states.add(entry);
      State start = course.enter(entry);
      if (!start.equals(entry)) {
        settled = "settled to " + Words.temperature(start.temperature());
        march.states.add(start);
      }
      march.run(start);
      return new Branch(
          march.states,
          march.ends,
          Node.join(settled, march.words()),
          !march.clipped,
          Optional.empty());
    } catch (OutsideValidity failure) {
      return new Branch(
          march.states,
          List.of(),
          Node.join(settled, march.words()),
          !march.clipped,
          Optional.of(String.valueOf(failure.getMessage())));
    }
  }

  private void run(State start) {
    Optional<Target> target = plan.target(course, start);
    if (target.isEmpty()) {
      ends.add(start);
      return;
    }
    boolean goesOn = advance(course.coordinate().of(start), target.get().near(), STEPS_TO_NEAR);
    ends.add(last());
    if (goesOn && target.get().far() != target.get().near()) {
      advance(target.get().near(), target.get().far(), STEPS_TO_FAR);
      ends.add(last());
    }
  }

  /** Marches in equal ratios of the coordinate; false if the pressure floor stopped it. */
  private boolean advance(double from, double to, int steps) {
    OptionalDouble floor = plan.pressureFloor();
    for (int i = 1; i <= steps; i++) {
      double value = i == steps ? to : from * Math.pow(to / from, i / (double) steps);
      State next = course.advance(last(), value);
      if (floor.isPresent() && next.pressure() < floor.getAsDouble()) {
        keep(course.byPressure().advance(last(), floor.getAsDouble()));
        return false;
      }
      keep(next);
    }
    return true;
  }

  private void keep(State state) {
    states.add(state);
    double temperature = state.temperature();
    boolean held =
        temperature == course.exchange().floor() || temperature == course.exchange().ceiling();
    clipped |= held;
    free |= !held;
  }

  private State last() {
    return states.get(states.size() - 1);
  }

  private String words() {
    if (!clipped && !free) {
      return plan.step() instanceof Step.Hold ? "" : "no flow";
    }
    if (!clipped) {
      return plan.adiabaticWords();
    }
    String at = Words.temperature(last().temperature());
    return free
        ? plan.adiabaticWords() + " until the surroundings hold it at " + at
        : plan.step().kind() + " held at " + at;
  }
}
