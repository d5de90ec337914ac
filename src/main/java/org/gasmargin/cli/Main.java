package org.gasmargin.cli;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.IParameterExceptionHandler;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ScopeType;
import picocli.CommandLine.Spec;
import picocli.CommandLine.UnmatchedArgumentException;

/** The program's entry: commands, and what happens to errors. */
@Command(
    name = "gasmargin",
    scope = ScopeType.INHERIT,
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class,
    subcommands = {CheckCommand.class},
    synopsisSubcommandLabel = "COMMAND",
    description =
        "Predicts temperatures and pressures when gas is filled, vented or compressed fast, and"
            + " compares them with design limits. It predicts and never gives permission.",
    exitCodeListHeading = "Exit codes:%n",
    exitCodeList = {
      "0:every finding is within its limits",
      "1:a margin is short or a limit is exceeded",
      "2:the input or the usage is wrong",
      "3:something was not assessed, and nothing is worse",
      "70:internal fault"
    })
public final class Main implements Runnable {
  @Spec
  @SuppressWarnings("NullAway.Init")
  private CommandSpec spec;

  private Main() {}

  /** A call without a command is a wrong usage. */
  @Override
  public void run() {
    throw new ParameterException(spec.commandLine(), "a command is missing");
  }

  /** Runs the program. */
  public static void main(String[] arguments) {
    System.setProperty("java.awt.headless", "true");
    PrintWriter out = new PrintWriter(System.out, true, StandardCharsets.UTF_8);
    PrintWriter err = new PrintWriter(System.err, true, StandardCharsets.UTF_8);
    int code = commandLine(out, err).execute(arguments);
    out.flush();
    err.flush();
    System.exit(code);
  }

  /** The command line with its output streams and error handling. */
  static CommandLine commandLine(PrintWriter out, PrintWriter err) {
    CommandLine commandLine = new CommandLine(new Main());
    commandLine.setOut(out);
    commandLine.setErr(err);
    commandLine.setParameterExceptionHandler(usageErrors());
    commandLine.setExecutionExceptionHandler(otherErrors());
    return commandLine;
  }

  private static IParameterExceptionHandler usageErrors() {
    return (ParameterException problem, String[] arguments) -> {
      CommandLine where = problem.getCommandLine();
      where.getErr().println("gasmargin: " + problem.getMessage());
      if (!UnmatchedArgumentException.printSuggestions(problem, where.getErr())) {
        where
            .getErr()
            .println("gasmargin: see '" + where.getCommandSpec().qualifiedName() + " --help'");
      }
      return ExitCode.INPUT_OR_USAGE;
    };
  }

  private static IExecutionExceptionHandler otherErrors() {
    return (Exception problem, CommandLine where, CommandLine.ParseResult parsed) -> {
      if (problem instanceof InputRefused refused) {
        refused.lines().forEach(where.getErr()::println);
        return ExitCode.INPUT_OR_USAGE;
      }
      where
          .getErr()
          .println(
              "gasmargin: internal fault ("
                  + problem
                  + "); nothing was judged. Please report it with the job file.");
      return ExitCode.INTERNAL_FAULT;
    };
  }
}
