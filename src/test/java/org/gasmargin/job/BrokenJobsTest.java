package org.gasmargin.job;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.stream.Stream;
import org.gasmargin.yaml.Issue;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Beside each broken file stands {@code .expected}: one line an error, in the order of the file.
 */
class BrokenJobsTest {
  static Stream<String> broken() {
    return BrokenJobs.names().stream();
  }

  @ParameterizedTest
  @MethodSource("broken")
  void everyErrorIsOneLineWithItsPlace(String name) {
    JobErrors errors =
        assertThrows(
            JobErrors.class, () -> Jobs.READER.read(name + ".yaml", BrokenJobs.text(name)));
    List<String> lines = errors.issues().stream().map(Issue::toString).toList();
    assertEquals(BrokenJobs.expected(name), lines);
  }
}
