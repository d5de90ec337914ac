package org.gasmargin.rules;

/**
 * A rule that was looked at and does not concern a step.
 *
 * @param rule identifier of the rule
 * @param step identifier of the step
 * @param reason why it does not apply, one sentence
 */
public record NotApplied(String rule, String step, String reason) {}
