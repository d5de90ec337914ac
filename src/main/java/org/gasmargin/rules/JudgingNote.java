package org.gasmargin.rules;

import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.process.Step;
import org.gasmargin.units.Dimension;

/** Findings that come from judging itself and not from a rule; all of them NOT ASSESSED. */
final class JudgingNote {
  private JudgingNote() {}

  static Finding of(Step step, String id, String reason) {
    return new Finding(
        id,
        "Not assessed",
        step.id(),
        step.vessel(),
        Verdict.NOT_ASSESSED,
        Severity.DANGER,
        "none",
        Dimension.RATIO,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        "",
        reason,
        "What was not assessed must be assessed by other means before the work goes on.",
        "how this program judges",
        SourceStatus.DEFINITION.words());
  }
}
