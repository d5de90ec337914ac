package org.gasmargin.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.units.Interval;
import org.gasmargin.yaml.Issues;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class JudgeTest {
  private static final List<RulePack> PACKS = RulePackLoader.load(Path.of("rules"));

  @Test
  void theWorstFindingHeadsTheJob() {
    Judgement judgement = SampleCase.fill().judge(PACKS);
    assertEquals(Verdict.OVER_LIMIT, judgement.verdict());
    assertEquals("oxygen.pressurisation", judgement.findings().get(0).rule());
    List<Verdict> verdicts = judgement.findings().stream().map(Finding::verdict).toList();
    assertEquals(verdicts.stream().sorted(Collections.reverseOrder()).toList(), verdicts);
  }

  @Test
  void dangersComeFirstAmongEquallyBadFindings() {
    SampleCase fast =
        SampleCase.fill()
            .withLimit(SampleCase.limit(LimitKind.MAX_PRESSURE_RATE, 1e4))
            .withLimit(SampleCase.limit(LimitKind.MAX_PRESSURE, 100e5));
    List<Severity> severities =
        fast.judge(PACKS).findings().stream()
            .filter(finding -> finding.verdict() == Verdict.OVER_LIMIT)
            .map(Finding::severity)
            .toList();
    assertEquals(
        List.of(Severity.DANGER, Severity.DANGER, Severity.DAMAGE, Severity.DAMAGE), severities);
  }

  @Test
  void whatCannotBeJudgedInOneStepIsNoStartForTheNext() {
    StepResult broken = SampleCase.fill().with(Optional.of(new Closure(0, 1e-3))).result();
    StepResult sound = SampleCase.fill().result();
    Step.Fill first = (Step.Fill) broken.step();
    Step second =
        new Step.Fill("2", first.vessel(), first.supply(), first.drive(), first.inletDiameter());
    JudgingCase one = SampleCase.fill().judgingCase(List.of("general"));
    Procedure procedure =
        new Procedure(
            one.result().procedure().site(),
            one.result().procedure().vessels(),
            List.of(first, second));
    StepResult after =
        new StepResult(
            second,
            sound.paths(),
            sound.envelope(),
            sound.credited(),
            sound.closure(),
            sound.settledAmount(),
            List.of(),
            List.of(),
            Optional.empty());
    JudgingCase both =
        new JudgingCase(
            new ProcedureResult(procedure, List.of(broken, after)),
            one.limits(),
            JudgeOn.BOUNDS,
            List.of("general"),
            SampleCase.UNITS);
    List<Finding> findings = Judge.judge(both, PACKS).findings();
    assertTrue(findings.stream().allMatch(f -> f.verdict() == Verdict.NOT_ASSESSED));
    assertTrue(
        findings.stream()
            .filter(f -> f.step().equals("2") && f.rule().startsWith("general."))
            .allMatch(f -> f.reason().contains("step 1 cannot be judged: the balances do not")));
  }

  @Test
  void theOrderOfRulesAndPacksNeverMatters() {
    Judgement expected = SampleCase.fill().judge(PACKS);
    Random random = new Random(20260101);
    for (int i = 0; i < 50; i++) {
      List<RulePack> shuffled = new ArrayList<>();
      for (RulePack pack : PACKS) {
        List<Rule> rules = new ArrayList<>(pack.rules());
        Collections.shuffle(rules, random);
        shuffled.add(new RulePack(pack.name(), pack.title(), pack.askedBy(), rules, pack.sha256()));
      }
      Collections.shuffle(shuffled, random);
      assertEquals(expected, SampleCase.fill().judge(shuffled));
    }
  }

  @Test
  void aJudgementWithoutFindingsIsImpossible() {
    assertThrows(
        IllegalArgumentException.class,
        () -> new Judgement(JudgeOn.BOUNDS, List.of(), List.of(), List.of()));
  }

  @Test
  void aStepToWhichNoRuleAppliesIsNotAssessed() {
    Judgement judgement =
        SampleCase.vent(290).with(List.of()).judge(List.of(pack("cylinder_fill")));
    assertEquals(
        List.of("judging.no_rule_applies"),
        judgement.findings().stream().map(Finding::rule).toList());
    assertEquals(Verdict.NOT_ASSESSED, judgement.verdict());
  }

  @Test
  void aStepThatWasNotComputedIsNotAssessed() {
    JudgingCase complete = SampleCase.vent(290).judgingCase(List.of("general"));
    JudgingCase lacking =
        new JudgingCase(
            new ProcedureResult(complete.result().procedure(), List.of()),
            complete.limits(),
            JudgeOn.BOUNDS,
            List.of("general"),
            SampleCase.UNITS);
    Judgement judgement = Judge.judge(lacking, PACKS);
    assertEquals(Verdict.NOT_ASSESSED, judgement.verdict());
    assertEquals("judging.not_computed", judgement.findings().get(0).rule());
  }

  @Test
  void aPackThatIsNotThereIsNotAssessed() {
    Judgement judgement =
        Judge.judge(SampleCase.vent(290).judgingCase(List.of("genral", "general")), PACKS);
    Finding finding = finding(judgement, "judging.unknown_pack").orElseThrow();
    assertEquals(Verdict.NOT_ASSESSED, finding.verdict());
    assertEquals("there is no rule pack 'genral'", finding.reason());
  }

  @Test
  void aLimitThatNoRuleLooksAtIsNotAssessed() {
    SampleCase vent =
        SampleCase.vent(290).with(List.of(SampleCase.limit(LimitKind.IGNITION_TEMPERATURE, 500)));
    Finding finding = finding(vent.judge(PACKS), "judging.unused_limit").orElseThrow();
    assertEquals(Verdict.NOT_ASSESSED, finding.verdict());
    assertTrue(finding.reason().contains("ignition_temperature"));
  }

  @Test
  void generalIsUsedForEveryJobAndOxygenWhereTheGasAsks() {
    assertEquals(List.of("general", "oxygen"), used(SampleCase.fill()));
    assertEquals(List.of("general"), used(SampleCase.fill().with(SampleCase.gas("nitrogen"))));
    assertEquals(List.of("general"), used(SampleCase.fill().with(SampleCase.gas("air"))));
    PackUsed oxygen = Judge.judge(SampleCase.fill().judgingCase(List.of()), PACKS).packs().get(1);
    assertEquals("used because the gas is an oxidiser", oxygen.because());
    assertEquals(pack("oxygen").sha256(), oxygen.sha256());
  }

  private static List<String> used(SampleCase subject) {
    return Judge.judge(subject.judgingCase(List.of()), PACKS).packs().stream()
        .map(PackUsed::name)
        .toList();
  }

  @Test
  void aRuleThatDoesNotApplySaysWhy() {
    Judgement judgement = SampleCase.vent(290).judge(PACKS);
    NotApplied silent =
        judgement.notApplied().stream()
            .filter(one -> one.rule().equals("cylinder_fill.fill_rate"))
            .findFirst()
            .orElseThrow();
    assertEquals("applies only when the step is a fill", silent.reason());
    assertTrue(finding(judgement, "cylinder_fill.fill_rate").isEmpty());
  }

  /** Sign convention: a positive margin is inside. Numbers: arithmetic on the inputs shown. */
  @ParameterizedTest
  @CsvSource({
    "max_gas_temperature, 334.15, 338.15, 4.0, MARGIN_SHORT",
    "max_metal_temperature, 361.45, 358.15, -3.3, OVER_LIMIT",
    "min_metal_temperature, 238.65, 253.15, -14.5, OVER_LIMIT",
    "min_metal_temperature, 260.15, 253.15, 7.0, WITHIN_LIMITS"
  })
  void marginsArePositiveInside(
      String kind, double predicted, double limit, double margin, Verdict verdict) {
    LimitKind limitKind = LimitKind.of(kind).orElseThrow();
    SampleCase subject =
        SampleCase.fill().with(envelope(predicted)).withLimit(SampleCase.limit(limitKind, limit));
    Finding finding = finding(subject.judge(PACKS), "general." + kind).orElseThrow();
    assertEquals(margin, finding.margin().orElseThrow(), 1e-9);
    assertEquals(verdict, finding.verdict());
  }

  @Test
  void metalIsTakenAsFarAsGasOrSurroundingsWhicheverIsFurther() {
    Extreme gas = new Extreme(300, "gas");
    Envelope envelope =
        new Envelope(
            Optional.of(gas),
            Optional.of(gas),
            Optional.of(gas),
            Optional.of(gas),
            Optional.empty(),
            330,
            270,
            List.of());
    Judgement judgement = SampleCase.fill().with(envelope).judge(PACKS);
    assertEquals(330, predicted(judgement, "general.max_metal_temperature"));
    assertEquals(270, predicted(judgement, "general.min_metal_temperature"));
    Judgement hotter = SampleCase.fill().with(envelope(340)).judge(PACKS);
    assertEquals(340, predicted(hotter, "general.max_metal_temperature"));
  }

  @Test
  void theModelledPathIsJudgedWithItsUncertaintyWhereTheUserCreditsIt() {
    SampleCase modelled = SampleCase.fill().on(JudgeOn.MODELLED);
    Judgement judgement = modelled.judge(PACKS);
    assertEquals(310, predicted(judgement, "general.max_gas_temperature"));
    assertEquals(
        "modelled path, film ± 20 %",
        finding(judgement, "general.max_gas_temperature").orElseThrow().path());
    assertEquals(JudgeOn.MODELLED, judgement.judgedOn());
  }

  @Test
  void heatTakenByTheWallIsNeverCreditedToUnmixedOrTrappedGas() {
    Judgement fill = SampleCase.fill().on(JudgeOn.MODELLED).judge(PACKS);
    assertEquals(900, predicted(fill, "oxygen.pressurisation"));
    Judgement deadLeg = SampleCase.deadLeg().on(JudgeOn.MODELLED).judge(PACKS);
    assertEquals(1098, predicted(deadLeg, "oxygen.trapped_gas"));
    assertEquals(1098, predicted(deadLeg, "general.max_trapped_gas_temperature"));
    assertEquals(150e5, predicted(deadLeg, "general.max_pressure"));
  }

  @Test
  void theEndOfALimitsToleranceThatIsAgainstTheUserCounts() {
    SampleCase subject =
        SampleCase.fill()
            .withLimit(
                SampleCase.limit(
                    LimitKind.MAX_PRESSURE, Interval.around(155e5, 6e5), OptionalDouble.empty()))
            .withLimit(
                SampleCase.limit(
                    LimitKind.MIN_METAL_TEMPERATURE,
                    Interval.around(280, 11),
                    OptionalDouble.empty()));
    Judgement judgement = subject.judge(PACKS);
    assertEquals(
        149e5, finding(judgement, "general.max_pressure").orElseThrow().limit().orElseThrow());
    assertEquals(
        Verdict.OVER_LIMIT, finding(judgement, "general.max_pressure").orElseThrow().verdict());
    assertEquals(
        291,
        finding(judgement, "general.min_metal_temperature").orElseThrow().limit().orElseThrow());
    assertEquals(
        Verdict.OVER_LIMIT,
        finding(judgement, "general.min_metal_temperature").orElseThrow().verdict());
  }

  @Test
  void theUsersMarginReplacesTheRulesAndASmallerOneIsNamed() {
    Finding smaller = withMargin(2);
    assertEquals(2, smaller.requiredMargin().orElseThrow());
    assertEquals(Verdict.WITHIN_LIMITS, smaller.verdict());
    assertTrue(smaller.reason().contains("smaller than the 5.0 K of the rule"), smaller.reason());
    Finding larger = withMargin(25);
    assertEquals(Verdict.MARGIN_SHORT, larger.verdict());
    assertFalse(larger.reason().contains("smaller"));
    assertEquals(Verdict.NOT_ASSESSED, withMargin(-1).verdict());
    assertEquals(Verdict.NOT_ASSESSED, withMargin(Double.NaN).verdict());
  }

  private static Finding withMargin(double margin) {
    Limit limit =
        SampleCase.limit(
            LimitKind.MAX_GAS_TEMPERATURE, Interval.exactly(340), OptionalDouble.of(margin));
    return finding(SampleCase.fill().withLimit(limit).judge(PACKS), "general.max_gas_temperature")
        .orElseThrow();
  }

  @Test
  void aLimitLooserThanTheDefaultOfTheRuleIsNamedAsLooser() {
    Finding own = fillRate(SampleCase.limit(LimitKind.MAX_PRESSURE_RATE, 60e5 / 60));
    assertEquals(Verdict.WITHIN_LIMITS, own.verdict());
    assertTrue(own.reason().contains("looser than 41.37 bar/min"), own.reason());
    assertEquals("nameplate", own.limitOrigin().orElseThrow());
    Finding tighter = fillRate(SampleCase.limit(LimitKind.MAX_PRESSURE_RATE, 20e5 / 60));
    assertEquals(Verdict.OVER_LIMIT, tighter.verdict());
    assertFalse(tighter.reason().contains("looser"));
  }

  private static Finding fillRate(Limit limit) {
    return finding(SampleCase.fill().withLimit(limit).judge(PACKS), "cylinder_fill.fill_rate")
        .orElseThrow();
  }

  @Test
  void belowTheIgnitionTemperatureNothingIsCleared() {
    SampleCase cool =
        SampleCase.fill().withLimit(SampleCase.limit(LimitKind.IGNITION_TEMPERATURE, 1500));
    Finding finding = finding(cool.judge(PACKS), "oxygen.pressurisation").orElseThrow();
    assertEquals(Verdict.NOT_ASSESSED, finding.verdict());
    assertTrue(finding.reason().contains("clears nothing"));
    assertEquals(600, finding.margin().orElseThrow(), 1e-9);
  }

  @Test
  void roundOffAtTheLimitDecidesNothing() {
    double limit = 200e5 + 101_325;
    assertEquals(Verdict.WITHIN_LIMITS, atPressure(limit * (1 + 1e-12), limit));
    assertEquals(Verdict.OVER_LIMIT, atPressure(limit * (1 + 1e-8), limit));
  }

  private static Verdict atPressure(double pressure, double limit) {
    Envelope envelope = envelope(300);
    Envelope moved =
        new Envelope(
            envelope.highestGasTemperature(),
            envelope.lowestGasTemperature(),
            Optional.of(new Extreme(pressure, "fill")),
            envelope.lowestPressure(),
            Optional.empty(),
            300,
            290,
            List.of());
    SampleCase subject =
        SampleCase.fill().with(moved).withLimit(SampleCase.limit(LimitKind.MAX_PRESSURE, limit));
    return finding(subject.judge(PACKS), "general.max_pressure").orElseThrow().verdict();
  }

  @Test
  void aFailedPathLeavesTheRateUnknown() {
    Judgement judgement = SampleCase.fill().with(SampleCase.failed("too cold")).judge(PACKS);
    Finding rate = finding(judgement, "cylinder_fill.fill_rate").orElseThrow();
    assertEquals(Verdict.NOT_ASSESSED, rate.verdict());
    assertEquals(
        Verdict.WITHIN_LIMITS, finding(judgement, "general.max_pressure").orElseThrow().verdict());
  }

  @Test
  void everyCautionDefersToThoseWhoDecide() {
    for (Finding finding : SampleCase.fill().judge(PACKS).findings()) {
      assertTrue(finding.caution().endsWith(" decide."), finding.caution());
    }
  }

  @Test
  void aDefaultThatNeedsAMissingLimitIsNotAssessed() {
    String text =
        BrokenPackTest.SOUND.replace(
            "value: degC(70.0)", "value: limit.min_gas_temperature + K(90.0)");
    List<RulePack> own =
        RulePackLoader.load(
            List.of(new RulePackLoader.Source("own.yaml", "own", text)), new Issues());
    SampleCase bare = SampleCase.fill().with(List.of());
    assertEquals(
        Verdict.NOT_ASSESSED, finding(bare.judge(own), "own.hose").orElseThrow().verdict());
    SampleCase given =
        SampleCase.fill().with(List.of(SampleCase.limit(LimitKind.MIN_GAS_TEMPERATURE, 250)));
    Finding finding = finding(given.judge(own), "own.hose").orElseThrow();
    assertEquals(340, finding.limit().orElseThrow(), 1e-9);
    assertTrue(finding.limitOrigin().orElseThrow().startsWith("default of the rule"));
  }

  private static Envelope envelope(double temperature) {
    Extreme extreme = new Extreme(temperature, "gas");
    return new Envelope(
        Optional.of(extreme),
        Optional.of(extreme),
        Optional.of(new Extreme(150e5, "fill")),
        Optional.of(new Extreme(10e5, "start")),
        Optional.of(extreme),
        temperature,
        temperature,
        List.of());
  }

  private static double predicted(Judgement judgement, String rule) {
    return finding(judgement, rule).orElseThrow().predicted().orElseThrow();
  }

  private static Optional<Finding> finding(Judgement judgement, String rule) {
    return judgement.findings().stream().filter(f -> f.rule().equals(rule)).findFirst();
  }

  private static RulePack pack(String name) {
    return PACKS.stream().filter(pack -> pack.name().equals(name)).findFirst().orElseThrow();
  }
}
