package org.gasmargin.rules;

/**
 * A limit that a rule brings along for jobs that state none. It is always shown as such.
 *
 * @param value gives the limit
 * @param source where the figure comes from
 */
record DefaultLimit(Expression value, SourceText source) {
  /** Where the limit comes from, for a finding. */
  String origin() {
    return "default of the rule, not of the job: "
        + source.words()
        + " ("
        + source.status().words()
        + ")";
  }
}
