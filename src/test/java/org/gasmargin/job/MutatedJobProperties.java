package org.gasmargin.job;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.gasmargin.yaml.Issue;
import org.snakeyaml.engine.v2.api.Dump;
import org.snakeyaml.engine.v2.api.DumpSettings;
import org.snakeyaml.engine.v2.schema.CoreSchema;

/** Good jobs, spoiled at random, give a job or errors and never anything else. */
class MutatedJobProperties {
  private static final List<String> GOOD =
      List.of(
          Jobs.text("/jobs/sketch.yaml"),
          Jobs.text("/jobs/every-form.yaml"),
          Jobs.text("/jobs/numbers.yaml"),
          Jobs.sampleText("receiver-blow-down"));

  @Property(tries = 500, seed = "20261")
  void spoiledTextGivesAJobOrErrorsOfOneLine(
      @ForAll @IntRange(max = 3) int which, @ForAll Random random) {
    String text = new TextSpoiler(random).spoil(GOOD.get(which));
    Optional<JobErrors> errors = errorsOf(text);
    long lines = text.lines().count() + 1;
    for (Issue issue : errors.map(JobErrors::issues).orElse(List.of())) {
      assertEquals(1, issue.toString().lines().count());
      assertTrue(issue.place().line() >= 1 && issue.place().line() <= lines, issue.toString());
      assertTrue(issue.place().column() >= 1);
      assertFalse(issue.problem().isBlank());
    }
    if (errors.isEmpty()) {
      assertTrue(JobSchema.accepts(text), text);
    }
  }

  @Property(tries = 500, seed = "20261")
  void readerAndSchemaRefuseTheSameSpoiledStructures(
      @ForAll @IntRange(max = 3) int which, @ForAll Random random) {
    Object tree = new TreeSpoiler(random).spoil(GOOD.get(which));
    String text =
        new Dump(DumpSettings.builder().setSchema(new CoreSchema()).build()).dumpToString(tree);
    Optional<JobErrors> errors = errorsOf(text);
    boolean wellFormed = errors.map(StructuralIssues::of).orElse(List.of()).isEmpty();
    assertEquals(
        wellFormed,
        JobSchema.accepts(text),
        () -> errors.map(JobErrors::getMessage).orElse("accepted") + "\n" + text);
  }

  private static Optional<JobErrors> errorsOf(String text) {
    try {
      Jobs.READER.read("job.yaml", text);
      return Optional.empty();
    } catch (JobErrors e) {
      return Optional.of(e);
    }
  }
}
