package org.gasmargin.cli;

import picocli.CommandLine;
import picocli.CommandLine.Command;

/** The program's entry. */
@Command(
    name = "gasmargin",
    mixinStandardHelpOptions = true,
    version = "gasmargin 0.1.0",
    description = "Predicts temperatures and pressures of gas filled, vented or compressed fast.")
public final class Main {
  private Main() {}

  /** Runs the program. */
  public static void main(String[] arguments) {
    System.exit(new CommandLine(new Main()).execute(arguments));
  }
}
