package org.gasmargin.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The command as a user meets it: output files, console text and exit codes. */
class CheckCommandTest {
  private static final String TOP_UP = "sample-jobs/receiver-top-up.yaml";

  @TempDir
  @SuppressWarnings("NullAway.Init")
  private Path folder;

  /** What one run printed and returned. */
  private record Run(int code, String out, String err) {}

  private static Run run(String... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int code =
        Main.commandLine(new PrintWriter(out, true), new PrintWriter(err, true)).execute(arguments);
    return new Run(code, out.toString(), err.toString());
  }

  private List<String> files() throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.map(file -> String.valueOf(file.getFileName())).sorted().toList();
    }
  }

  private Path job(String text) throws IOException {
    return Files.writeString(Files.createDirectory(folder.resolve("in")).resolve("job.yaml"), text);
  }

  @Test
  void aCheckLeavesWorksheetResultAndSeriesAndPrintsTheVerdict() throws IOException {
    Run run = run("check", TOP_UP, "--out", folder.toString());
    assertEquals(1, run.code(), run.err());
    assertEquals(
        List.of("receiver-top-up-series.csv", "receiver-top-up.json", "receiver-top-up.pdf"),
        files());
    assertTrue(run.out().startsWith("OVER LIMIT  Top-up of a ring-main receiver"), run.out());
    assertTrue(run.out().contains("licensed inspection decide"));
    assertEquals("", run.err());
  }

  @Test
  void jsonGoesToStandardOutputAloneAndEqualsTheFile() throws IOException {
    Run run = run("check", TOP_UP, "--out", folder.toString(), "--json", "--no-pdf");
    assertEquals(
        Files.readString(folder.resolve("receiver-top-up.json")).strip(), run.out().strip());
    assertFalse(Files.exists(folder.resolve("receiver-top-up.pdf")));
    assertFalse(run.out().contains("NaN"));
  }

  @Test
  void theSameInputGivesTheSameBytes() throws IOException {
    run("check", TOP_UP, "--out", folder.resolve("a").toString());
    run("check", TOP_UP, "--out", folder.resolve("b").toString());
    for (String name :
        List.of("receiver-top-up.pdf", "receiver-top-up.json", "receiver-top-up-series.csv")) {
      assertEquals(
          -1,
          Files.mismatch(folder.resolve("a").resolve(name), folder.resolve("b").resolve(name)),
          name);
    }
  }

  @Test
  void theOtherSampleJobsComeOutAsTheirScenariosMean() {
    Run oxygen =
        run("check", "sample-jobs/oxygen-ball-valve.yaml", "--no-pdf", "--out", folder.toString());
    assertEquals(1, oxygen.code(), oxygen.err());
    assertTrue(oxygen.out().startsWith("OVER LIMIT"), oxygen.out());
    Run blowDown =
        run("check", "sample-jobs/receiver-blow-down.yaml", "--no-pdf", "--out", folder.toString());
    assertEquals(1, blowDown.code(), blowDown.err());
    assertTrue(
        blowDown
            .out()
            .lines()
            .anyMatch(line -> line.matches("(OVER LIMIT|MARGIN SHORT) .*lowest metal.*")),
        blowDown.out());
  }

  @Test
  void aBrokenJobGivesOneLineForEachErrorAndLeavesNothing() throws IOException {
    Path broken =
        job(Files.readString(Path.of(TOP_UP)).replace("pressure: 300 bar(g)", "presure: 300 bar"));
    Path out = folder.resolve("out");
    Run run = run("check", broken.toString(), "--out", out.toString());
    assertEquals(2, run.code());
    assertEquals("", run.out());
    assertTrue(run.err().contains("unknown key 'presure'"), run.err());
    assertTrue(run.err().lines().allMatch(line -> line.startsWith(broken + ":")), run.err());
    assertFalse(Files.exists(out));
  }

  @Test
  void aMissingFileAndAWrongOptionAreUsageErrors() {
    Run missing = run("check", "no-such-job.yaml");
    assertEquals(2, missing.code());
    assertEquals(1, missing.err().lines().count(), missing.err());
    Run option = run("check", TOP_UP, "--ot", folder.toString());
    assertEquals(2, option.code());
    assertTrue(option.err().contains("--ot"), option.err());
    assertEquals(2, run("chek").code());
    assertEquals(2, run().code());
  }

  @Test
  void anOutputFolderThatIsAFileIsRefusedWithOneLine() throws IOException {
    Path file = Files.writeString(folder.resolve("taken"), "x");
    Run run = run("check", TOP_UP, "--no-pdf", "--out", file.toString());
    assertEquals(2, run.code());
    assertEquals(1, run.err().lines().count(), run.err());
    assertEquals(List.of("taken"), files());
  }

  @Test
  void aStartStateWithoutGasPropertiesIsRefusedWithOneLine() throws IOException {
    Path job =
        job(
            """
            job: {title: Cold start}
            site: {ambient_temperature: 20 degC, atmospheric_pressure: 1.013 bar(a)}
            vessels:
              v:
                gas: nitrogen
                volume: 10 L
                start: {pressure: 100 bar(a), temperature: -180 degC}
            steps:
              - hold: {for: 1 min}
            """);
    Run run = run("check", job.toString(), "--out", folder.resolve("out").toString());
    assertTrue(run.code() == 2 || run.code() == 3, run.err());
    assertFalse(run.err().contains("Exception"), run.err());
  }

  @Test
  void helpNamesTheExitCodes() {
    Run run = run("check", "--help");
    assertEquals(0, run.code());
    String text = run.out().replaceAll("\\s+", " ");
    assertTrue(text.contains("something was not assessed"), text);
    assertTrue(text.contains("not a permission"), text);
  }
}
