package org.gasmargin.process.bounds;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Step;

/**
 * Follows the branches of one step from every state in which it can be entered.
 *
 * <p>From each entry three branches are followed. On the first no heat passes. On the second the
 * gas is kept at least as hot as the hottest surroundings, on the third at most as hot as the
 * coldest; while it is beyond them, no heat passes. What the step prescribes (pressure or density)
 * leaves the gas one unknown, its temperature, whose rate of change is that of the adiabatic path
 * plus a term with the sign of (surroundings - gas). By comparison of the two differential
 * equations every path with any exchange of heat lies between the third branch and the second.
 */
final class StepBounds {
  private final StepPlan plan;
  private final Surroundings surroundings;
  private final ExtremeSearch hottest = new ExtremeSearch(State::temperature, true);
  private final ExtremeSearch coldest = new ExtremeSearch(State::temperature, false);
  private final ExtremeSearch highest = new ExtremeSearch(State::pressure, true);
  private final ExtremeSearch lowest = new ExtremeSearch(State::pressure, false);
  private final List<Node> ends = new ArrayList<>();
  private final List<String> failures = new ArrayList<>();
  private boolean complete;

  private StepBounds(StepPlan plan, NodeSet entries, Surroundings surroundings) {
    this.plan = plan;
    this.surroundings = surroundings;
    this.complete = entries.complete();
  }

  /**
   * What the branches of a step reach.
   *
   * @param envelope the extremes
   * @param ends the states in which the step can end; empty if no branch was followed to its end
   */
  record Reach(Envelope envelope, Optional<NodeSet> ends) {}

  /** Follows all branches of a step. */
  static Reach follow(StepPlan plan, NodeSet entries, Surroundings surroundings) {
    StepBounds bounds = new StepBounds(plan, entries, surroundings);
    if (!entries.complete()) {
      bounds.failures.add("an earlier step left the validity of its model, so its end is unknown");
      bounds.loseAll();
    }
    bounds.followAll(entries);
    Optional<Extreme> unmixed = entries.complete() ? bounds.unmixed(entries) : Optional.empty();
    return new Reach(
        new Envelope(
            bounds.hottest.result(),
            bounds.coldest.result(),
            bounds.highest.result(),
            bounds.lowest.result(),
            unmixed,
            surroundings.hottest(),
            surroundings.coldest(),
            bounds.failures.stream().distinct().toList()),
        bounds.ends.isEmpty()
            ? Optional.empty()
            : Optional.of(new NodeSet(bounds.ends, bounds.complete).pruned()));
  }

  private void followAll(NodeSet entries) {
    try {
      PathLaw hot = plan.law(true);
      PathLaw cold = plan.law(false);
      for (Node entry : entries.nodes()) {
        take(entry, branch(entry, hot, Exchange.NONE));
        Branch up = branch(entry, hot, Exchange.keepAbove(surroundings.hottest()));
        take(entry, up);
        up.failure().ifPresent(why -> loseHigh());
        Branch down = branch(entry, cold, Exchange.keepBelow(surroundings.coldest()));
        take(entry, down);
        down.failure().ifPresent(why -> loseLow());
      }
    } catch (OutsideValidity supplyFailure) {
      failures.add(String.valueOf(supplyFailure.getMessage()));
      complete = false;
      loseAll();
    }
  }

  private Branch branch(Node entry, PathLaw law, Exchange exchange) {
    Course course = new Course(plan.vessel().gas(), law, plan.coordinate(), exchange);
    return BranchMarch.follow(plan, course, entry.state());
  }

  private void take(Node entry, Branch branch) {
    for (int i = 0; i < branch.states().size(); i++) {
      String words = i == 0 ? entry.words() : Node.join(entry.words(), branch.words());
      State state = branch.states().get(i);
      Optional<State> from = branch.stretchStart(i);
      hottest.consider(state, words, from);
      coldest.consider(state, words, from);
      highest.consider(state, words, from);
      lowest.consider(state, words, from);
    }
    for (State end : branch.ends()) {
      ends.add(entry.then(end, branch.words()));
    }
    branch
        .failure()
        .ifPresent(
            why -> {
              failures.add(Node.join(entry.words(), branch.words()) + ": " + why);
              complete = false;
              State last = branch.states().get(branch.states().size() - 1);
              if (last.temperature() > entry.state().temperature()) {
                loseHigh();
              } else {
                loseLow();
              }
            });
  }

  private void loseHigh() {
    hottest.lose();
    highest.lose();
  }

  private void loseLow() {
    coldest.lose();
    lowest.lose();
  }

  private void loseAll() {
    loseHigh();
    loseLow();
  }

  /**
   * The hottest that gas can become which is pushed ahead and does not mix: the isentrope from the
   * hottest start to the highest pressure of the step.
   */
  private Optional<Extreme> unmixed(NodeSet entries) {
    if (!(plan.step() instanceof Step.Fill || plan.step() instanceof Step.Compress)) {
      return Optional.empty();
    }
    Optional<Extreme> peak = highest.result();
    if (peak.isEmpty()) {
      return Optional.empty();
    }
    ExtremeSearch search = new ExtremeSearch(State::temperature, true);
    Course course =
        new Course(
            plan.vessel().gas(),
            new PathLaw.Isentropic(),
            Coordinate.PRESSURE,
            Exchange.keepAbove(surroundings.hottest()));
    for (Node entry : entries.nodes()) {
      try {
        State start = course.enter(entry.state());
        String settled =
            start.equals(entry.state())
                ? ""
                : "settled to " + Words.temperature(start.temperature());
        State end =
            peak.get().value() > start.pressure()
                ? plan.vessel().gas().atPressureEntropy(peak.get().value(), start.entropy())
                : start;
        search.consider(
            end,
            Node.join(
                Node.join(entry.words(), settled), "pushed ahead without mixing or heat loss"),
            Optional.of(start));
      } catch (OutsideValidity failure) {
        failures.add("gas pushed ahead without mixing: " + failure.getMessage());
        return Optional.empty();
      }
    }
    return search.result();
  }
}
