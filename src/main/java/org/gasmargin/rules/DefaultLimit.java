package org.gasmargin.rules;

/**
 * A limit that a rule brings along for jobs that state none. It is always shown as such.
 *
 * @param value gives the limit
 * @param source where the figure comes from
 * @param status how far it may be trusted
 */
record DefaultLimit(Expression value, String source, SourceStatus status) {
  /** Where the limit comes from, for a finding. */
  String origin() {
    return "default of the rule, not of the job: " + source + " (" + status.words() + ")";
  }
}
