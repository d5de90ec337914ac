package org.gasmargin.cli;

import org.gasmargin.rules.Verdict;

/** The exit codes of the program. */
final class ExitCode {
  static final int WITHIN_LIMITS = 0;
  static final int MARGIN_SHORT_OR_OVER = 1;
  static final int INPUT_OR_USAGE = 2;
  static final int NOT_ASSESSED = 3;
  static final int INTERNAL_FAULT = 70;

  private ExitCode() {}

  /** The exit code that tells a verdict. */
  static int of(Verdict verdict) {
    return switch (verdict) {
      case WITHIN_LIMITS -> WITHIN_LIMITS;
      case NOT_ASSESSED -> NOT_ASSESSED;
      case MARGIN_SHORT, OVER_LIMIT -> MARGIN_SHORT_OR_OVER;
    };
  }
}
