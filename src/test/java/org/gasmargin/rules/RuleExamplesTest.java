package org.gasmargin.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class RuleExamplesTest {
  private static final List<RulePack> PACKS = RulePackLoader.load(Path.of("rules"));

  static Stream<ExampleOutcome> everyExample() {
    return PACKS.stream().flatMap(pack -> pack.runExamples().stream());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("everyExample")
  void everyExampleOfEveryPackHolds(ExampleOutcome outcome) {
    assertTrue(outcome.holds(), outcome.toString());
  }

  @Test
  void thePacksOfTheFolderComeWithTheProgram() {
    List<RulePack> builtIn = RulePackLoader.loadBuiltIn();
    assertEquals(
        PACKS.stream().map(pack -> pack.name() + " " + pack.sha256()).toList(),
        builtIn.stream().map(pack -> pack.name() + " " + pack.sha256()).sorted().toList());
  }
}
