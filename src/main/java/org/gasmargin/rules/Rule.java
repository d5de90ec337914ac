package org.gasmargin.rules;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.gasmargin.units.Dimension;

/**
 * A rule, read and checked.
 *
 * @param id pack and name, for example {@code general.max_pressure}
 * @param title one line
 * @param condition when it applies; empty if always
 * @param predicted what is held against the limit
 * @param limit which of the user's limits it is held against
 * @param defaultLimit used where the user states none
 * @param direction on which side the value has to stay
 * @param requiredMargin gives a difference, zero or above
 * @param severity what breaking it means
 * @param insideIsNoPass why being inside the limit is still no pass, for limits that only condemn
 * @param caution printed with each finding
 * @param lookup what to look up when the limit is missing, and where it usually stands
 * @param source of the rule
 * @param examples held by {@link RulePack#runExamples}
 */
record Rule(
    String id,
    String title,
    Optional<Condition> condition,
    Predicted predicted,
    Optional<LimitKind> limit,
    Optional<DefaultLimit> defaultLimit,
    Direction direction,
    Expression requiredMargin,
    Severity severity,
    Optional<String> insideIsNoPass,
    String caution,
    String lookup,
    SourceText source,
    List<RuleExample> examples) {

  Rule {
    examples = List.copyOf(examples);
  }

  /**
   * When something applies.
   *
   * @param when true or false
   * @param words the same for people, to follow "applies when"
   */
  record Condition(Expression when, String words) {}

  /**
   * What is held against the limit.
   *
   * @param name in words
   * @param value gives the number
   */
  record Predicted(String name, Expression value) {
    /** What it measures. */
    Dimension dimension() {
      return value.dimension().orElseThrow();
    }
  }

  /** The user's limits that the rule looks at. */
  Set<LimitKind> limitsUsed() {
    Set<LimitKind> used = new TreeSet<>();
    limit.ifPresent(used::add);
    for (LimitKind kind : LimitKind.values()) {
      if (predicted.value().names().contains(Vocabulary.limit(kind))
          || defaultLimit
              .filter(d -> d.value().names().contains(Vocabulary.limit(kind)))
              .isPresent()) {
        used.add(kind);
      }
    }
    return used;
  }
}
