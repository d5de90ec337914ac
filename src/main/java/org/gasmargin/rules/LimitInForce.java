package org.gasmargin.rules;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.Interval;

/**
 * The limit that counts for a rule in a step: the user's, or else the rule's marked default.
 *
 * @param value SI, finite
 * @param origin where it comes from
 * @param requiredMargin the margin asked for
 * @param notes what the reader must know of the choice; empty, or begins with "; "
 */
record LimitInForce(double value, String origin, Operand requiredMargin, String notes) {
  private static final String NO_SOURCE = "the job, which does not say where it was read";

  /**
   * Finds the limit.
   *
   * @param marginOfRule the rule's own required margin
   * @param unknown receives the reason if the default limit cannot be evaluated
   */
  static Optional<LimitInForce> of(
      Rule rule, StepView view, Operand marginOfRule, Set<String> unknown) {
    Optional<Operand> standard = rule.defaultLimit().map(d -> d.value().evaluate(view.operands()));
    Optional<Limit> own =
        rule.limit().flatMap(kind -> strictest(view.limits(), kind, rule.direction()));
    if (own.isPresent()) {
      return Optional.of(ofUser(rule, view, own.get(), marginOfRule, standard));
    }
    if (standard.isEmpty()) {
      return Optional.empty();
    }
    if (standard.get() instanceof Operand.Figure figure) {
      String origin = rule.defaultLimit().orElseThrow().origin();
      return Optional.of(new LimitInForce(figure.si(), origin, marginOfRule, ""));
    }
    unknown.add("the default limit is not known: " + rule.lookup());
    return Optional.empty();
  }

  /** The required margin if it is a number. */
  OptionalDouble requiredMarginIfKnown() {
    return requiredMargin instanceof Operand.Figure figure
        ? OptionalDouble.of(figure.si())
        : OptionalDouble.empty();
  }

  private static LimitInForce ofUser(
      Rule rule, StepView view, Limit limit, Operand marginOfRule, Optional<Operand> standard) {
    double value = against(limit.value().si(), rule.direction());
    StringBuilder notes = new StringBuilder();
    if (standard.isPresent()
        && standard.get() instanceof Operand.Figure figure
        && rule.direction().isLooser(value, figure.si())) {
      notes
          .append("; the limit of the job is looser than ")
          .append(view.units().format(figure.si(), rule.predicted().dimension()))
          .append(", the ")
          .append(rule.defaultLimit().orElseThrow().origin());
    }
    Operand margin = marginOfRule;
    if (limit.requiredMargin().isPresent()) {
      Dimension difference = rule.predicted().dimension().difference();
      double asked = limit.requiredMargin().getAsDouble();
      margin =
          Operand.number(new Measure(difference, asked), "", "the margin that the job asks for");
      if (marginOfRule instanceof Operand.Figure own && asked < own.si()) {
        notes
            .append("; the margin that the job asks for is smaller than the ")
            .append(view.units().format(own.si(), difference))
            .append(" of the rule");
      }
    }
    return new LimitInForce(value, limit.readFrom().orElse(NO_SOURCE), margin, notes.toString());
  }

  private static Optional<Limit> strictest(
      List<Limit> limits, LimitKind kind, Direction direction) {
    Comparator<Limit> byValue =
        Comparator.comparingDouble(limit -> against(limit.value().si(), direction));
    return limits.stream()
        .filter(limit -> limit.kind() == kind)
        .min(direction == Direction.AT_MOST ? byValue : byValue.reversed());
  }

  /** The end of a limit's tolerance that is against the user. */
  private static double against(Interval limit, Direction direction) {
    return direction == Direction.AT_MOST ? limit.low() : limit.high();
  }
}
