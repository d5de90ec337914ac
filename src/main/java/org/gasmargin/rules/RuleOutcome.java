package org.gasmargin.rules;

/** What a rule says of a step. */
sealed interface RuleOutcome {

  /** It concerns the step. */
  record Found(Finding finding) implements RuleOutcome {}

  /** It does not concern the step. */
  record Silent(NotApplied notApplied) implements RuleOutcome {}
}
