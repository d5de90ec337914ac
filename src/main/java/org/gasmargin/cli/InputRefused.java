package org.gasmargin.cli;

import java.util.List;
import org.gasmargin.yaml.Issue;

/** Input that the user can put right; ends the command with one line for each problem. */
final class InputRefused extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<String> lines;

  InputRefused(List<String> lines) {
    super(String.join("\n", lines));
    this.lines = List.copyOf(lines);
  }

  /** A line for each issue of a file. */
  static InputRefused with(List<Issue> issues) {
    return new InputRefused(issues.stream().map(Issue::toString).toList());
  }

  /** One line for each problem. */
  List<String> lines() {
    return lines;
  }
}
