package org.gasmargin.cli;

import java.util.List;

/** Input that the user can put right; ends the command with one line for each problem. */
final class InputRefused extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<String> lines;

  InputRefused(List<String> lines) {
    super(String.join("\n", lines));
    this.lines = List.copyOf(lines);
  }

  /** One line for each problem. */
  List<String> lines() {
    return lines;
  }
}
