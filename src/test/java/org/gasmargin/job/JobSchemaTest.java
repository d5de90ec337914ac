package org.gasmargin.job;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The published schema and the reader hold the same files to be well formed. */
class JobSchemaTest {
  /** Refused before there is a tree that a schema could look at, for a reason of safety. */
  private static final Set<String> NO_TREE = Set.of("alias", "explicit-tag", "nesting-bomb");

  static Stream<String> broken() {
    return BrokenJobs.names().stream().filter(name -> !NO_TREE.contains(name));
  }

  @ParameterizedTest
  @MethodSource("broken")
  void schemaRefusesABrokenFileIfItsStructureIsBroken(String name) {
    String text = BrokenJobs.text(name);
    JobErrors errors = assertThrows(JobErrors.class, () -> Jobs.READER.read(name + ".yaml", text));
    boolean wellFormed = StructuralIssues.of(errors).isEmpty();
    assertEquals(wellFormed, JobSchema.accepts(text), errors.getMessage());
  }

  @ParameterizedTest
  @ValueSource(strings = {"receiver-top-up", "oxygen-ball-valve", "receiver-blow-down"})
  void schemaAcceptsTheSampleJobs(String name) {
    assertTrue(JobSchema.accepts(Jobs.sampleText(name)));
  }

  @ParameterizedTest
  @ValueSource(strings = {"sketch", "numbers", "every-form"})
  void schemaAcceptsEveryFormThatTheReaderAccepts(String name) {
    assertTrue(JobSchema.accepts(Jobs.text("/jobs/" + name + ".yaml")));
  }
}
