package org.gasmargin.rules;

import java.util.LinkedHashSet;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.gasmargin.units.Dimension;

/**
 * Holds one rule against one step. Whatever is unknown ends NOT ASSESSED: an unknown condition, an
 * unknown or missing operand, a missing limit, a balance that does not close.
 */
final class RuleJudging {
  /** Relative difference of two numbers that may be round-off of the same calculation. */
  private static final double RESOLUTION = 1e-10;

  private final Rule rule;
  private final StepView view;
  private final Dimension difference;
  private final Set<String> unknown = new LinkedHashSet<>();

  private RuleJudging(Rule rule, StepView view) {
    this.rule = rule;
    this.view = view;
    difference = rule.predicted().dimension().difference();
  }

  /** What the rule says of the step. */
  static RuleOutcome judge(Rule rule, StepView view) {
    return new RuleJudging(rule, view).judge();
  }

  private RuleOutcome judge() {
    if (rule.condition().isPresent()) {
      Rule.Condition condition = rule.condition().get();
      Operand applies = condition.when().evaluate(view.operands());
      if (applies instanceof Operand.Unknown reason && view.distrust().isEmpty()) {
        unknown.add("it is not known whether the rule applies: " + reason.reason());
      } else if (applies instanceof Operand.Truth truth && !truth.holds()) {
        return new RuleOutcome.Silent(
            new NotApplied(rule.id(), view.step(), "applies only when " + condition.words()));
      }
    }
    return new RuleOutcome.Found(finding());
  }

  private Finding finding() {
    view.distrust().ifPresent(unknown::add);
    Operand quantity = rule.predicted().value().evaluate(view.operands());
    Optional<LimitInForce> limit = limit();
    if (quantity instanceof Operand.Unknown reason && view.distrust().isEmpty()) {
      unknown.add(reason.reason());
    }
    if (limit.isPresent() && limit.get().requiredMargin() instanceof Operand.Unknown reason) {
      unknown.add(reason.reason());
    }
    if (unknown.isEmpty()
        && quantity instanceof Operand.Figure predicted
        && limit.isPresent()
        && limit.get().requiredMargin() instanceof Operand.Figure required) {
      return judged(predicted, limit.get(), required.si());
    }
    return notAssessed(quantity, limit);
  }

  private Optional<LimitInForce> limit() {
    Operand ofRule = rule.requiredMargin().evaluate(view.operands());
    Optional<LimitInForce> limit = LimitInForce.of(rule, view, ofRule, unknown);
    if (limit.isEmpty() && rule.defaultLimit().isEmpty()) {
      unknown.add("the limit is missing: " + rule.lookup());
    }
    return limit;
  }

  private Finding judged(Operand.Figure predicted, LimitInForce limit, double required) {
    double margin = margin(predicted.si(), limit.value());
    if (!(Double.isFinite(margin) && Double.isFinite(required) && required >= 0)) {
      unknown.add("the margin cannot be calculated");
      return notAssessed(predicted, Optional.of(limit));
    }
    Verdict verdict;
    String reason;
    if (margin < 0) {
      verdict = Verdict.OVER_LIMIT;
      reason = format(-margin) + " beyond the limit";
    } else if (margin < required - RESOLUTION * Math.abs(limit.value())) {
      verdict = Verdict.MARGIN_SHORT;
      reason =
          format(margin) + " inside the limit, less than the " + format(required) + " asked for";
    } else if (rule.insideIsNoPass().isPresent()) {
      verdict = Verdict.NOT_ASSESSED;
      reason = format(margin) + " inside the limit, but " + rule.insideIsNoPass().get();
    } else {
      verdict = Verdict.WITHIN_LIMITS;
      reason = format(margin) + " inside the limit, " + format(required) + " asked for";
    }
    return finding(
        verdict,
        OptionalDouble.of(predicted.si()),
        Optional.of(limit),
        OptionalDouble.of(margin),
        predicted.path(),
        reason + limit.notes());
  }

  /** The distance to the limit; zero where round-off decides on which side it lies. */
  private double margin(double predicted, double limit) {
    double margin = rule.direction().margin(limit, predicted);
    return Math.abs(margin) <= RESOLUTION * Math.abs(limit) ? 0 : margin;
  }

  private Finding notAssessed(Operand quantity, Optional<LimitInForce> limit) {
    boolean trusted = view.distrust().isEmpty() && quantity instanceof Operand.Figure;
    return finding(
        Verdict.NOT_ASSESSED,
        trusted ? OptionalDouble.of(((Operand.Figure) quantity).si()) : OptionalDouble.empty(),
        limit,
        OptionalDouble.empty(),
        trusted ? ((Operand.Figure) quantity).path() : "",
        String.join("; ", unknown));
  }

  private Finding finding(
      Verdict verdict,
      OptionalDouble predicted,
      Optional<LimitInForce> limit,
      OptionalDouble margin,
      String path,
      String reason) {
    return new Finding(
        rule.id(),
        rule.title(),
        view.step(),
        view.vessel(),
        verdict,
        rule.severity(),
        rule.predicted().name(),
        rule.predicted().dimension(),
        predicted,
        limit.map(l -> OptionalDouble.of(l.value())).orElse(OptionalDouble.empty()),
        limit.map(LimitInForce::origin),
        margin,
        limit.map(LimitInForce::requiredMarginIfKnown).orElse(OptionalDouble.empty()),
        path,
        reason,
        rule.caution(),
        rule.source().words(),
        rule.source().status().words());
  }

  private String format(double margin) {
    return view.units().format(margin, difference);
  }
}
