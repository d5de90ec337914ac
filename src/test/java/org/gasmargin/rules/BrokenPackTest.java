package org.gasmargin.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.gasmargin.yaml.Issue;
import org.gasmargin.yaml.Issues;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Every slip in a pack is one line with its place, and nothing is judged with a part of it. */
class BrokenPackTest {
  static final String SOUND =
      """
      pack: own
      title: A pack of one's own
      deference: The site's rules decide.
      rules:
        - id: hose
          title: Hose temperature
          applies_when: step_kind == 'fill'
          applies_in_words: the step is a fill
          quantity: {name: highest gas temperature, value: peak_gas_temperature}
          direction: at_most
          limit: max_gas_temperature
          default_limit: {value: degC(70.0), source: hose maker, source_status: site rule}
          required_margin: K(3.0)
          severity: damage
          caution: Hoses age.
          lookup: look it up
          source: site
          source_status: site rule
          examples:
            - {name: cool, given: {step_kind: fill, peak_gas_temperature: degC(40.0)}, expect: WITHIN LIMITS}
            - {name: hot, given: {step_kind: fill, peak_gas_temperature: degC(90.0)}, expect: OVER LIMIT}
            - {name: unknown, given: {step_kind: fill}, expect: NOT ASSESSED}
      """;

  static Stream<Arguments> slips() {
    return Stream.of(
        slip(
            "value: peak_gas_temperature}",
            "value: peak_gas_temprature}",
            "9:54: unknown name 'peak_gas_temprature'; did you mean 'peak_gas_temperature'?"),
        slip(
            "value: peak_gas_temperature}",
            "value: peak_pressure}",
            "11:12: compares a pressure with a temperature",
            "12:28: compares a pressure with a temperature",
            "13:22: the margin is a temperature difference, a pressure difference was expected"),
        slip(
            "step_kind == 'fill'\n",
            "peak_pressure > limit.max_gas_temperature\n",
            "7:33: compares a pressure with a temperature"),
        slip(
            "step_kind == 'fill'\n",
            "\"peak_pressure > degC(3.0)\"\n",
            "7:34: compares a pressure with a temperature"),
        slip(
            "step_kind == 'fill'\n",
            "peak_pressure > lowest_pressure + K(5.0)\n",
            "7:51: adds a pressure and a temperature difference"),
        slip(
            "step_kind == 'fill'\n",
            "peak_pressure * 1.25 > bar_a(3.0)\n",
            "7:33: multiplies a pressure by a plain number"),
        slip(
            "step_kind == 'fill'\n",
            "K(5.0) * 2 > K(3.0)\n",
            "7:26: multiplies a temperature difference by a plain number; write a number with a"
                + " decimal point, as in 2.0"),
        slip(
            "step_kind == 'fill'\n",
            "peak_pressure == lowest_pressure\n",
            "7:33: compares a pressure with a pressure; == and != are for words and conditions,"
                + " numbers take <, <=, > or >="),
        slip(
            "step_kind == 'fill'\n",
            "peak_pressure\n",
            "7:19: rules.1.applies_when is a pressure, a condition was expected; write for example"
                + " \"step_kind == 'fill'\""),
        slip(
            "step_kind == 'fill'\n",
            "step_kind = 'fill'\n",
            "7:29: 'step_kind = 'fill'' is not an expression: token recognition error at: '= ';"
                + " to compare, write =="),
        slip(
            "applies_in_words: the step is a fill\n    quantity",
            "quantity",
            "5:5: applies_when and applies_in_words stand together or not at all in rules.1; the"
                + " words say the condition to people"),
        slip(
            "required_margin: K(3.0)",
            "required_margin: peak_gas_temperature - degC(3.0)",
            "13:22: 'peak_gas_temperature' cannot be used here, only figures, as in K(5.0) or"
                + " bar_a(200.0)"),
        slip(
            "required_margin: K(3.0)",
            "required_margin: K(-3.0)",
            "13:22: the margin must be a finite number, zero or above"),
        slip(
            "required_margin: K(3.0)",
            "required_margin: K(1e999)",
            "13:22: the margin must be a finite number, zero or above"),
        slip(
            "required_margin: K(3.0)",
            "required_margin: 5",
            "13:22: this gives a plain number, a quantity with its unit or a condition was"
                + " expected; write for example \"K(5.0)\" or \"peak_pressure > bar_a(10.0)\""),
        slip(
            "required_margin: K(3.0)",
            "required_margin: kelvin(3.0)",
            "13:22: unknown function 'kelvin'; there are K, degC, bar, bar_a, s, min, bar_per_min"),
        slip("    caution: Hoses age.\n", "", "5:5: missing key 'caution' in rules.1"),
        slip(
            "caution: Hoses age.",
            "cautoin: Hoses age.",
            "15:5: unknown key 'cautoin' in rules.1; did you mean 'caution'?"),
        slip(
            "severity: damage",
            "severity: dammage",
            "14:15: unknown word 'dammage' for rules.1.severity; did you mean 'damage'?"),
        slip(
            "direction: at_most",
            "direction: below",
            "10:16: unknown word 'below' for rules.1.direction; known are at_least, at_most"),
        slip(
            "expect: OVER LIMIT",
            "expect: OVER LIMITS",
            "21:89: unknown outcome 'OVER LIMITS' for rules.1.examples.2.expect; did you mean 'OVER"
                + " LIMIT'?"),
        slip(
            "expect: OVER LIMIT",
            "expect: WITHIN LIMITS",
            "19:5: no example ends OVER LIMIT; a rule is shown by at least one example of each"
                + " outcome"),
        slip(
            "peak_gas_temperature: degC(90.0)",
            "peak_gas_temperature: bar_a(90.0)",
            "21:68: peak_gas_temperature is a temperature, not a pressure"),
        slip(
            "limit: max_gas_temperature",
            "limit: max_gas_temprature",
            "11:12: unknown limit 'max_gas_temprature' for rules.1.limit; did you mean"
                + " 'max_gas_temperature'?"),
        slip(
            "source: site\n    source_status: site rule",
            "source: site\n    source_status: my own",
            "18:20: unknown word 'my own' for rules.1.source_status; known are common practice, no"
                + " source, confirmed, secondary, definition, from memory, published, site rule"),
        slip(
            "pack: own",
            "pack: mine",
            "1:7: the pack has another name than its file; write \"pack: own\" or name the file"
                + " mine.yaml"),
        slip(
            "deference: The site's rules decide.",
            "asked_by: step_kind == 'fill'\nasked_in_words: on fills\n"
                + "deference: The site's rules decide.",
            "3:11: 'step_kind' cannot be used here, only properties of the gas"),
        slip(
            "id: hose",
            "id: Hose 1",
            "5:9: an id is lower-case letters, digits and _, and begins"
                + " with a letter; write for example \"id: max_pressure\""),
        slip(
            "applies_when: step_kind",
            "applies_when: !step_kind",
            "7:19: the tag '!step_kind' is not allowed; YAML tags are not used here"));
  }

  private static Arguments slip(String from, String to, String... expected) {
    return Arguments.of(from, to, List.of(expected));
  }

  @ParameterizedTest(name = "{2}")
  @MethodSource("slips")
  void aSlipIsOneLineWithItsPlace(String from, String to, List<String> expected) {
    assertTrue(SOUND.contains(from), "the slip does not touch the pack");
    List<String> lines = errors(SOUND.replace(from, to));
    assertEquals(expected.stream().map(line -> "rules/own.yaml:" + line).toList(), lines);
  }

  @Test
  void theSoundPackIsReadAndItsExamplesHold() {
    RulePack pack = load(SOUND).get(0);
    assertEquals(List.of("own.hose"), pack.ruleIds());
    assertEquals(3, pack.runExamples().size());
    assertTrue(pack.runExamples().stream().allMatch(ExampleOutcome::holds));
  }

  @Test
  void aSecondRuleOfTheSameIdIsRefused() {
    String rule = SOUND.substring(SOUND.indexOf("  - id: hose"));
    assertEquals(
        List.of(
            "rules/own.yaml:23:9: the id 'hose' stands here a second time, first at line 5; every"
                + " rule of a pack has its own id"),
        errors(SOUND + rule));
  }

  @Test
  void allErrorsOfAllPacksAreToldAtOnceAndNoPackIsUsed() {
    Issues issues = new Issues();
    RulePackErrors errors =
        assertThrows(
            RulePackErrors.class,
            () ->
                RulePackLoader.load(
                    List.of(
                        new RulePackLoader.Source("a/own.yaml", "own", SOUND),
                        source(
                            SOUND
                                .replace("severity: damage", "severity: bad")
                                .replace("lookup: look it up", "look: it up"))),
                    issues));
    assertEquals(2, errors.issues().size());
    assertTrue(lines(errors).stream().allMatch(line -> line.startsWith("rules/own.yaml:")));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "gas_id.getClass().forName('java.lang.Runtime') == 'x'",
        "gas_id.matches('(a+)+b')",
        "gas_id.size() > 3",
        "''.getClass() == ''",
        "java.lang.System.exit(1) == 1",
        "System.exit(1)",
        "new('java.io.File')",
        "[1, 2, 3].all(x, x > 0)",
        "[1, 2, 3].map(x, [1, 2, 3].map(y, x * y)) == []",
        "{'a': 1}['a'] == 1",
        "[1][0] == 1",
        "google.protobuf.Any{} == null",
        "has(limit.max_pressure)",
        "type(peak_pressure) == type(peak_pressure)",
        "dyn(peak_pressure) > 3",
        "timestamp('2026-01-01T00:00:00Z') > timestamp('2025-01-01T00:00:00Z')",
        "duration('1s') > duration('0s')",
        "string(gas_id) == 'x'",
        "bytes('a') == b'a'",
        "gas_id in ['oxygen']",
        "null == null",
        "1u < 2u",
        "matches(gas_id, '.*')",
        "gas_id = 'oxygen'",
        "while (true) {}",
        "gas_id + gas_id == 'x'",
        "size(gas_id) > 3",
        "cel.bind(x, 1, x > 0)",
        "__result__ == 1",
        "gas.__class__",
        "limit == 3",
        "true ? peak_pressure : 3",
        "-peak_pressure < bar(3.0)",
        "((((((((((((((((((((((((((((((((((((((((true))))))))))))))))))))))))))))))))))))))))"
      })
  void hostileExpressionsAreRefused(String hostile) {
    List<String> lines = errors(SOUND.replace("step_kind == 'fill'", "\"" + hostile + "\""));
    assertTrue(
        lines.stream().anyMatch(line -> line.matches("rules/own\\.yaml:7:\\d+: .+")),
        lines.toString());
  }

  @Test
  void hugeTextsAreRefusedAndNotRead() {
    String huge = "gas_id == '" + "x".repeat(1000) + "'";
    assertTrue(
        errors(SOUND.replace("step_kind == 'fill'", huge))
            .get(0)
            .endsWith("rules.1.applies_when is longer than 500 letters"));
  }

  @Test
  void aFolderWithoutPacksIsAnError(@TempDir Path folder) throws IOException {
    assertTrue(messages(folder).get(0).contains("there is no rule pack in this folder"));
    assertTrue(messages(folder.resolve("absent")).get(0).contains("cannot be read"));
    Files.write(folder.resolve("own.yaml"), new byte[] {(byte) 0xff, (byte) 0xfe, 0});
    assertTrue(messages(folder).get(0).contains("own.yaml:1:1: the file is not text in UTF-8"));
    Files.writeString(folder.resolve("own.yaml"), "");
    assertTrue(messages(folder).get(0).contains("the file holds no rule pack"));
  }

  private static List<String> messages(Path folder) {
    RulePackErrors errors = assertThrows(RulePackErrors.class, () -> RulePackLoader.load(folder));
    return lines(errors);
  }

  private static List<String> errors(String text) {
    return lines(assertThrows(RulePackErrors.class, () -> load(text)));
  }

  private static List<String> lines(RulePackErrors errors) {
    return errors.issues().stream().map(Issue::toString).toList();
  }

  private static List<RulePack> load(String text) {
    return RulePackLoader.load(List.of(source(text)), new Issues());
  }

  private static RulePackLoader.Source source(String text) {
    return new RulePackLoader.Source("rules/own.yaml", "own", text);
  }
}
