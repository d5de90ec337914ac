package org.gasmargin.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import org.gasmargin.process.Closure;
import org.gasmargin.process.StepResult;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Proves for each rule of each pack that whatever is unknown ends NOT ASSESSED. */
class EveryRuleNotAssessedTest {
  private static final List<RulePack> PACKS = RulePackLoader.load(Path.of("rules"));
  private static final Map<String, UnaryOperator<SampleCase>> FAULTS = faults();

  /** A sound case for each rule, in which the rule is assessed. */
  private static final Map<String, SampleCase> CASES = cases();

  private static Map<String, SampleCase> cases() {
    Map<String, SampleCase> cases = new TreeMap<>();
    for (SampleCase one :
        List.of(SampleCase.fill(), SampleCase.linedFill(), SampleCase.deadLeg())) {
      for (Finding finding : one.judge(PACKS).findings()) {
        if (finding.verdict() != Verdict.NOT_ASSESSED) {
          cases.putIfAbsent(finding.rule(), one);
        }
      }
    }
    return cases;
  }

  private static Map<String, UnaryOperator<SampleCase>> faults() {
    Map<String, UnaryOperator<SampleCase>> faults = new TreeMap<>();
    faults.put("no closure", c -> c.with(Optional.<Closure>empty()));
    faults.put("mass does not close", c -> c.with(Optional.of(new Closure(1.1e-8, 0))));
    faults.put("energy does not close", c -> c.with(Optional.of(new Closure(0, -1.1e-8))));
    faults.put("closure is NaN", c -> c.with(Optional.of(new Closure(0, Double.NaN))));
    faults.put("closure is infinite", c -> c.with(Optional.of(new Closure(1 / 0.0, 0))));
    faults.put("paths contradict", c -> c.contradicted("gas warmer than its bound"));
    faults.put("out of range", c -> c.outOfRange("temperature 2300 K is above 2000 K"));
    faults.put(
        "out of range, modelled",
        c -> c.outOfRange("temperature 2300 K is above 2000 K").on(JudgeOn.MODELLED));
    return faults;
  }

  static Stream<String> everyRule() {
    return PACKS.stream().flatMap(pack -> pack.ruleIds().stream());
  }

  static Stream<Arguments> everyRuleWithEveryFault() {
    return everyRule().flatMap(r -> FAULTS.keySet().stream().map(fault -> Arguments.of(r, fault)));
  }

  static Stream<Arguments> everyRuleWithEveryQuantity() {
    return PACKS.stream()
        .flatMap(pack -> pack.rules().stream())
        .flatMap(
            rule ->
                Stream.of(ResultQuantity.values())
                    .filter(q -> rule.predicted().value().names().contains(q.key()))
                    .map(q -> Arguments.of(rule.id(), q)));
  }

  @ParameterizedTest
  @MethodSource("everyRule")
  void everyRuleIsAssessedInASoundCase(String rule) {
    assertTrue(CASES.containsKey(rule), "no sound case assesses " + rule);
    assertNotEquals(Verdict.NOT_ASSESSED, finding(sound(rule), rule).orElseThrow().verdict());
  }

  @ParameterizedTest(name = "{0}: {1}")
  @MethodSource("everyRuleWithEveryFault")
  void aFaultOfTheCalculationIsNeverAssessed(String rule, String fault) {
    SampleCase broken = FAULTS.getOrDefault(fault, UnaryOperator.identity()).apply(sound(rule));
    Finding finding = finding(broken, rule).orElseThrow();
    assertEquals(Verdict.NOT_ASSESSED, finding.verdict());
    assertTrue(finding.margin().isEmpty());
    assertTrue(finding.predicted().isEmpty());
    assertFalse(finding.reason().isBlank());
  }

  @ParameterizedTest(name = "{0} without {1}")
  @MethodSource("everyRuleWithEveryQuantity")
  void anUnknownOrNonFiniteQuantityIsNeverAssessed(String id, ResultQuantity quantity) {
    Rule rule = rule(id);
    for (double broken : new double[] {Double.NaN, 1 / 0.0, -1 / 0.0}) {
      Operand operand = Operand.number(new Measure(quantity.dimension(), broken), "", "it");
      Finding finding = judgeFailingExample(rule, quantity.key(), operand);
      assertEquals(Verdict.NOT_ASSESSED, finding.verdict());
      assertTrue(finding.predicted().isEmpty());
    }
  }

  @ParameterizedTest
  @MethodSource("everyRule")
  void aMissingLimitIsNeverAssessedAndSaysWhatToLookUp(String id) {
    Rule rule = rule(id);
    Optional<Finding> finding = finding(sound(id).with(List.of()), id);
    if (rule.condition().filter(c -> c.words().contains("gives")).isPresent()) {
      assertTrue(
          finding
              .map(f -> f.verdict() == Verdict.NOT_ASSESSED || rule.limit().isEmpty())
              .orElse(true));
    } else if (rule.defaultLimit().isPresent()) {
      assertTrue(
          finding.orElseThrow().limitOrigin().orElseThrow().startsWith("default of the rule"));
    } else {
      assertEquals(Verdict.NOT_ASSESSED, finding.orElseThrow().verdict());
      assertTrue(finding.orElseThrow().reason().contains(rule.lookup()));
      assertTrue(finding.orElseThrow().limit().isEmpty());
    }
  }

  @ParameterizedTest
  @MethodSource("everyRule")
  void aModelledExtremeThatIsNoNumberIsNeverAPass(String id) {
    double nan = Double.NaN;
    StepResult.Credited credited =
        new StepResult.Credited(
            nan, nan, nan, nan, OptionalDouble.of(nan), OptionalDouble.of(nan), "none");
    SampleCase broken =
        sound(id).with(credited).with(new StepResult.DensityRange(nan, nan)).on(JudgeOn.MODELLED);
    Verdict verdict = finding(broken, id).orElseThrow().verdict();
    Verdict onBounds = finding(sound(id), id).orElseThrow().verdict();
    boolean alwaysOnBounds =
        rule(id).predicted().value().names().contains(ResultQuantity.UNMIXED_TEMPERATURE.key());
    assertEquals(alwaysOnBounds ? onBounds : Verdict.NOT_ASSESSED, verdict);
  }

  @Test
  void theSoundCasesCoverEveryRule() {
    assertEquals(everyRule().sorted().toList(), List.copyOf(CASES.keySet()));
  }

  /** The example that ends OVER LIMIT, with one operand replaced. */
  private static Finding judgeFailingExample(Rule rule, String name, Operand operand) {
    RuleExample example =
        rule.examples().stream()
            .filter(e -> e.expected().equals(Optional.of(Verdict.OVER_LIMIT)))
            .findFirst()
            .orElseThrow();
    Map<String, Operand> given = new TreeMap<>(example.given());
    given.put(name, operand);
    RuleOutcome outcome =
        ExampleRun.judge(rule, new RuleExample(example.name(), given, Optional.empty()));
    return ((RuleOutcome.Found) outcome).finding();
  }

  private static SampleCase sound(String rule) {
    return Optional.ofNullable(CASES.get(rule)).orElseThrow();
  }

  private static Rule rule(String id) {
    return PACKS.stream()
        .flatMap(pack -> pack.rules().stream())
        .filter(rule -> rule.id().equals(id))
        .findFirst()
        .orElseThrow();
  }

  private static Optional<Finding> finding(SampleCase subject, String rule) {
    return subject.judge(PACKS).findings().stream().filter(f -> f.rule().equals(rule)).findFirst();
  }
}
