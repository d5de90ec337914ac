package org.gasmargin.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import org.gasmargin.worksheet.ResultJson;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Predicts, judges and writes the worksheet of one job. */
@Command(
    name = "check",
    description = {
      "Predicts every step of a job, judges it by rules and writes the worksheet (PDF), the result"
          + " (JSON) and the paths over time (CSV).",
      "The verdict is a prediction to be checked by a competent person, not a permission."
    })
final class CheckCommand implements Callable<Integer> {
  @Spec
  @SuppressWarnings("NullAway.Init")
  private CommandSpec spec;

  @Parameters(
      paramLabel = "JOB",
      description = "The job file, for example sample-jobs/receiver-top-up.yaml.")
  @SuppressWarnings("NullAway.Init")
  private Path job;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      defaultValue = "reports",
      description = "Folder for the output, made if missing (default: ${DEFAULT-VALUE}).")
  @SuppressWarnings("NullAway.Init")
  private Path out;

  @Option(names = "--no-pdf", description = "Write no worksheet.")
  private boolean noPdf;

  @Option(
      names = "--json",
      description = "Print the result as JSON on standard output instead of the table.")
  private boolean json;

  @Override
  public Integer call() {
    JobCheck check = JobCheck.of(job);
    String result = ResultJson.text(check.content());
    List<Path> written = new JobOutput(job, out, !noPdf).write(check.content(), result);
    if (json) {
      spec.commandLine().getOut().println(result);
    } else {
      new VerdictTable(check.content().units())
          .lines(check.content().title(), check.content().judgement())
          .forEach(spec.commandLine().getOut()::println);
      written.forEach(file -> spec.commandLine().getOut().println("wrote " + file));
    }
    return ExitCode.of(check.content().judgement().verdict());
  }
}
