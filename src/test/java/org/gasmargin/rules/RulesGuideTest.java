package org.gasmargin.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.gasmargin.yaml.Issues;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The guide names everything that a rule can use, and its example is a sound pack. */
class RulesGuideTest {
  private static final String GUIDE = read();

  static Stream<String> everyWord() {
    return Stream.of(
            Vocabulary.all().stream(),
            Stream.of(Constant.values()).map(constant -> constant.key() + "("),
            Stream.of(Direction.values()).map(Direction::key),
            Stream.of(Severity.values()).map(Severity::key),
            Stream.of(SourceStatus.values()).map(SourceStatus::words),
            RulePackLoader.loadBuiltIn().stream().map(RulePack::name))
        .flatMap(words -> words);
  }

  @ParameterizedTest
  @MethodSource("everyWord")
  void theGuideNamesEveryWordOfTheLanguage(String word) {
    assertTrue(GUIDE.contains("`" + word), word + " is not in the guide");
  }

  @Test
  void theFirstRuleOfTheGuideIsReadAndItsExamplesHold() {
    int start = GUIDE.indexOf("```yaml\n") + "```yaml\n".length();
    String pack = GUIDE.substring(start, GUIDE.indexOf("```", start));
    List<RulePack> packs =
        RulePackLoader.load(
            List.of(new RulePackLoader.Source("hose.yaml", "hose", pack)), new Issues());
    List<ExampleOutcome> outcomes = packs.get(0).runExamples();
    assertEquals(3, outcomes.size());
    assertTrue(outcomes.stream().allMatch(ExampleOutcome::holds), outcomes.toString());
  }

  private static String read() {
    try {
      return Files.readString(Path.of("docs/rules.md"));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
