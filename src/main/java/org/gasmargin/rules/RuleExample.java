package org.gasmargin.rules;

import java.util.Map;
import java.util.Optional;

/**
 * A case with a known answer.
 *
 * @param name in words
 * @param given operands by name
 * @param expected the verdict; empty if the rule must not apply
 */
record RuleExample(String name, Map<String, Operand> given, Optional<Verdict> expected) {
  /** The word in a rule pack for a rule that must not apply. */
  static final String DOES_NOT_APPLY = "DOES NOT APPLY";

  RuleExample {
    given = Map.copyOf(given);
  }

  /** The word for an expected or actual outcome. */
  static String words(Optional<Verdict> verdict) {
    return verdict.map(Verdict::words).orElse(DOES_NOT_APPLY);
  }
}
