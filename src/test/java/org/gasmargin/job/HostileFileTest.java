package org.gasmargin.job;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Random;
import org.gasmargin.yaml.Issue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Files that nobody meant well are refused at once with one line. */
class HostileFileTest {
  @Test
  void aFileOfFiveMegabytesIsNotReadToItsEnd(@TempDir Path folder) throws IOException {
    assertEquals(
        ":1:1: the file is larger than 256 KiB, too large",
        refusal(folder, "a: b\n".repeat(1 << 20).getBytes(UTF_8)));
  }

  @Test
  void binaryJunkIsNotText(@TempDir Path folder) throws IOException {
    byte[] junk = new byte[100_000];
    new Random(7).nextBytes(junk);
    assertEquals(
        ":1:1: the file is not text in UTF-8; save it again as UTF-8", refusal(folder, junk));
  }

  @Test
  void nullBytesAreNoYaml(@TempDir Path folder) throws IOException {
    assertEquals(
        ":1:9: the character U+0000 cannot stand in such a file",
        refusal(folder, "job: {ti\0tle: a}".getBytes(UTF_8)));
  }

  @Test
  void aHundredThousandBracketsAreRefusedAtTheirDepth(@TempDir Path folder) throws IOException {
    assertEquals(
        ":1:21: this is nested more than 20 deep",
        refusal(folder, "[".repeat(100_000).getBytes(UTF_8)));
    assertEquals(
        ":1:41: this is nested more than 20 deep",
        refusal(folder, ("- ".repeat(60_000) + "a").getBytes(UTF_8)));
  }

  @Test
  void aHundredThousandValuesAreTooMany(@TempDir Path folder) throws IOException {
    assertEquals(
        ":1:40000: the file holds more than 20000 values",
        refusal(folder, ("[" + "1,".repeat(100_000) + "]").getBytes(UTF_8)));
  }

  @Test
  void aTitleOfTwoHundredKilobytesIsNotRepeatedInItsError(@TempDir Path folder) throws IOException {
    String line = refusal(folder, ("job: {title: " + "x".repeat(200_000) + "}").getBytes(UTF_8));
    assertEquals(":1:1: missing key 'site' at the top of the file", line);
  }

  @Test
  void ofThousandsOfErrorsTheFirstHundredAreTold() {
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < 5000; i++) {
      text.append("key").append(i).append(": 1\n");
    }
    List<Issue> issues =
        assertThrows(JobErrors.class, () -> Jobs.READER.read("job.yaml", text.toString())).issues();
    assertEquals(101, issues.size());
    assertTrue(issues.get(100).toString().endsWith(": and 4904 more errors from here on"));
  }

  @Test
  void escapesForTheTerminalDoNotReachIt() {
    List<Issue> issues =
        assertThrows(JobErrors.class, () -> Jobs.READER.read("job.yaml", "\"\\e[2J\\n\\u202e\": 1"))
            .issues();
    assertEquals(
        "job.yaml:1:1: unknown key '?[2J??' at the top of the file; known here are confirmed, job,"
            + " judge_on, rules, site, steps, supplies, vessels",
        issues.get(0).toString());
  }

  @Test
  void aFolderAndAMissingFileAreSaidToBeSo(@TempDir Path folder) {
    assertEquals(
        folder + ":1:1: this is a folder, a file was expected",
        assertThrows(JobErrors.class, () -> Jobs.READER.read(folder)).getMessage());
    Path missing = folder.resolve("missing.yaml");
    assertEquals(
        missing + ":1:1: there is no such file",
        assertThrows(JobErrors.class, () -> Jobs.READER.read(missing)).getMessage());
  }

  /** The first line of the refusal without the name of the file. */
  private static String refusal(Path folder, byte[] bytes) throws IOException {
    Path file = Files.write(folder.resolve("hostile.yaml"), bytes);
    JobErrors errors =
        assertTimeoutPreemptively(
            Duration.ofSeconds(5),
            () -> assertThrows(JobErrors.class, () -> Jobs.READER.read(file)));
    return errors.issues().get(0).toString().substring(file.toString().length());
  }
}
