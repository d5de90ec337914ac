package org.gasmargin.rules;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Interval;
import org.gasmargin.units.Quantity;
import org.gasmargin.units.Unit;

/** Runs an example by the same way as a real step. */
final class ExampleRun {
  private static final String NAME = "example";

  private ExampleRun() {}

  static ExampleOutcome of(Rule rule, RuleExample example) {
    RuleOutcome outcome = judge(rule, example);
    Optional<Verdict> verdict = Optional.empty();
    String reason = "";
    if (outcome instanceof RuleOutcome.Found found) {
      verdict = Optional.of(found.finding().verdict());
      reason = found.finding().reason();
    } else if (outcome instanceof RuleOutcome.Silent silent) {
      reason = silent.notApplied().reason();
    }
    return new ExampleOutcome(
        rule.id(),
        example.name(),
        RuleExample.words(example.expected()),
        RuleExample.words(verdict),
        reason);
  }

  /** What the rule says of the example's case. */
  static RuleOutcome judge(Rule rule, RuleExample example) {
    return RuleJudging.judge(rule, view(example));
  }

  /** Facts that an example leaves out are false or an empty word; numbers are unknown. */
  private static StepView view(RuleExample example) {
    Map<String, Operand> values = new HashMap<>();
    for (Fact fact : Fact.values()) {
      values.put(fact.key(), fact.isWord() ? new Operand.Word("") : new Operand.Truth(false));
    }
    values.putAll(example.given());
    List<Limit> limits = limits(example);
    StepOperands.limits(limits, values);
    return new StepView(
        NAME,
        NAME,
        new Operands(values),
        limits,
        Optional.empty(),
        new DisplayUnits(Map.of(), 101325));
  }

  private static List<Limit> limits(RuleExample example) {
    List<Limit> limits = new ArrayList<>();
    for (LimitKind kind : LimitKind.values()) {
      if (example.given().get(Vocabulary.limit(kind)) instanceof Operand.Figure figure) {
        limits.add(
            new Limit(
                kind,
                new Quantity(Interval.exactly(figure.si()), Unit.BAR_ABSOLUTE, ""),
                Optional.of(NAME),
                OptionalDouble.empty()));
      }
    }
    return limits;
  }
}
