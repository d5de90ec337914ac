package org.gasmargin.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.Interval;
import org.gasmargin.units.Place;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.YamlNode;

/** Laws of judging that hold for every rule of every pack and any numbers. */
class JudgingProperties {
  private static final List<RulePack> PACKS = RulePackLoader.load(Path.of("rules"));
  private static final List<Rule> RULES =
      PACKS.stream().flatMap(pack -> pack.rules().stream()).toList();
  private static final List<Rule> WITH_LIMIT =
      RULES.stream().filter(rule -> rule.limit().isPresent()).toList();
  private static final ExpressionLanguage LANGUAGE = new ExpressionLanguage();

  @Provide
  Arbitrary<Rule> anyRule() {
    return Arbitraries.of(WITH_LIMIT);
  }

  @Property(seed = "20260101", tries = 400)
  void aStricterLimitNeverImprovesAVerdict(
      @ForAll("anyRule") Rule rule,
      @ForAll @DoubleRange(min = 0.2, max = 3) double predicted,
      @ForAll @DoubleRange(min = 0.2, max = 3) double limit,
      @ForAll @DoubleRange(min = 0, max = 1) double step) {
    double stricter = rule.direction() == Direction.AT_MOST ? limit - step : limit + step;
    Verdict before = judge(rule, predicted, Interval.exactly(limit), OptionalDouble.empty());
    Verdict after = judge(rule, predicted, Interval.exactly(stricter), OptionalDouble.empty());
    assertNotBetter(after, before);
  }

  @Property(seed = "20260102", tries = 400)
  void aWiderToleranceOfALimitNeverImprovesAVerdict(
      @ForAll("anyRule") Rule rule,
      @ForAll @DoubleRange(min = 0.2, max = 3) double predicted,
      @ForAll @DoubleRange(min = 0.2, max = 3) double limit,
      @ForAll @DoubleRange(min = 0, max = 0.5) double narrow,
      @ForAll @DoubleRange(min = 0, max = 0.5) double more) {
    Verdict before = judge(rule, predicted, Interval.around(limit, narrow), OptionalDouble.empty());
    Verdict after =
        judge(rule, predicted, Interval.around(limit, narrow + more), OptionalDouble.empty());
    assertNotBetter(after, before);
  }

  @Property(seed = "20260103", tries = 400)
  void aLargerRequiredMarginNeverImprovesAVerdict(
      @ForAll("anyRule") Rule rule,
      @ForAll @DoubleRange(min = 0.2, max = 3) double predicted,
      @ForAll @DoubleRange(min = 0.2, max = 3) double limit,
      @ForAll @DoubleRange(min = 0, max = 1) double margin,
      @ForAll @DoubleRange(min = 0, max = 1) double more) {
    double unit = unit(rule.predicted().dimension());
    Interval typed = Interval.exactly(limit);
    Verdict before = judge(rule, predicted, typed, OptionalDouble.of(margin * unit));
    Verdict after = judge(rule, predicted, typed, OptionalDouble.of((margin + more) * unit));
    assertNotBetter(after, before);
  }

  @Property(seed = "20260104", tries = 400)
  void aWorsePredictionNeverImprovesAVerdict(
      @ForAll("anyRule") Rule rule,
      @ForAll @DoubleRange(min = 0.2, max = 3) double predicted,
      @ForAll @DoubleRange(min = 0.2, max = 3) double limit,
      @ForAll @DoubleRange(min = 0, max = 1) double step) {
    double worse = rule.direction() == Direction.AT_MOST ? predicted + step : predicted - step;
    Interval typed = Interval.exactly(limit);
    Verdict before = judge(rule, predicted, typed, OptionalDouble.empty());
    Verdict after = judge(rule, worse, typed, OptionalDouble.empty());
    assertNotBetter(after, before);
  }

  @Property(seed = "20260105", tries = 400)
  void withinLimitsMeansInsideByTheMarginAskedFor(
      @ForAll("anyRule") Rule rule,
      @ForAll @DoubleRange(min = 0.2, max = 3) double predicted,
      @ForAll @DoubleRange(min = 0.2, max = 3) double limit,
      @ForAll @DoubleRange(min = 0, max = 1) double margin) {
    double unit = unit(rule.predicted().dimension());
    Verdict verdict =
        judge(rule, predicted, Interval.exactly(limit), OptionalDouble.of(margin * unit));
    double distance = rule.direction() == Direction.AT_MOST ? limit - predicted : predicted - limit;
    boolean inside = distance >= margin - 1e-8;
    assertTrue(verdict != Verdict.WITHIN_LIMITS || inside);
    assertEquals(distance < -1e-8, verdict == Verdict.OVER_LIMIT);
  }

  @Property(seed = "20260106", tries = 300)
  void oneUnknownOperandMakesAnyExpressionUnknown(@ForAll("conditions") String text) {
    Expression expression = compile(text).orElseThrow();
    Map<String, Operand> known = new HashMap<>();
    for (String name : expression.names()) {
      known.put(
          name,
          Vocabulary.dimension(name)
              .<Operand>map(d -> new Operand.Figure(new Measure(d, 300), ""))
              .orElse(new Operand.Truth(true)));
    }
    assertTrue(expression.evaluate(new Operands(known)) instanceof Operand.Truth);
    for (String name : expression.names()) {
      Map<String, Operand> lacking = new HashMap<>(known);
      lacking.put(name, new Operand.Unknown("the " + name + " was lost"));
      Operand value = expression.evaluate(new Operands(lacking));
      assertTrue(
          value instanceof Operand.Unknown unknown
              && unknown.reason().equals("the " + name + " was lost"),
          text + " gave " + value);
    }
  }

  private static void assertNotBetter(Verdict after, Verdict before) {
    assertTrue(after.compareTo(before) >= 0, before + " became " + after);
  }

  /** Random conditions of pressures, temperatures and facts joined by every operator. */
  @Provide
  Arbitrary<String> conditions() {
    Arbitrary<String> temperature =
        Arbitraries.of("peak_gas_temperature", "lowest_gas_temperature", "degC(20.0)");
    Arbitrary<String> difference =
        Combinators.combine(temperature, temperature).as((a, b) -> a + " - " + b);
    Arbitrary<String> relation = Arbitraries.of("<", "<=", ">", ">=");
    Arbitrary<String> comparison =
        Combinators.combine(difference, relation)
            .as((left, sign) -> "(" + left + ") * 2.0 / 3.0 + K(1.0) " + sign + " K(5.0)");
    Arbitrary<String> leaf =
        Arbitraries.oneOf(comparison, Arbitraries.of("gas.oxidiser", "trapped", "has_wall"));
    Arbitrary<String> joined =
        Combinators.combine(leaf, Arbitraries.of("&&", "||", "==", "!="), leaf)
            .as((a, sign, b) -> "(" + a + ") " + sign + " (" + b + ")");
    return Combinators.combine(joined, joined, joined)
        .as((a, b, c) -> "(" + a + ") ? !(" + b + ") : (" + c + ")");
  }

  @Example
  void onlyThePermittedDimensionsMeet() {
    for (Dimension left : Arithmetic.DIMENSIONS) {
      for (Dimension right : Arithmetic.DIMENSIONS) {
        for (Arithmetic.Operator operator : Arithmetic.Operator.values()) {
          String sign = operator.function().replace("_", " ");
          Optional<Dimension> expected =
              Arithmetic.operations().stream()
                  .filter(o -> o.operator() == operator && o.left() == left && o.right() == right)
                  .map(Arithmetic.Operation::result)
                  .findFirst();
          Optional<Expression> compiled = compile(sample(left) + sign + sample(right));
          assertEquals(expected, compiled.flatMap(Expression::dimension), left + sign + right);
        }
        assertEquals(
            left == right, compile(sample(left) + " < " + sample(right)).isPresent(), left + "<");
      }
    }
  }

  private static String sample(Dimension dimension) {
    return switch (dimension) {
      case ABSOLUTE_PRESSURE -> "peak_pressure";
      case PRESSURE_DIFFERENCE -> "bar(2.0)";
      case TEMPERATURE -> "peak_gas_temperature";
      case TEMPERATURE_DIFFERENCE -> "K(2.0)";
      case PRESSURE_RATE -> "mean_pressure_rate";
      case TIME -> "duration";
      default -> "2.0";
    };
  }

  private static Optional<Expression> compile(String text) {
    return LANGUAGE.compile(
        new YamlNode.Text(new Place("p", 1, 1), text, false, true), Scope.STEP, new Issues());
  }

  /** Judges a rule by its own examples' facts, with numbers in units of the dimension. */
  private static Verdict judge(Rule rule, double predicted, Interval limit, OptionalDouble margin) {
    double unit = unit(rule.predicted().dimension());
    Map<String, Operand> values = new HashMap<>();
    for (Fact fact : Fact.values()) {
      values.put(fact.key(), fact.isWord() ? new Operand.Word("") : new Operand.Truth(false));
    }
    rule.examples().get(0).given().forEach((name, operand) -> values.put(name, operand));
    for (ResultQuantity quantity : ResultQuantity.values()) {
      if (rule.predicted().value().names().contains(quantity.key())) {
        Measure measure = new Measure(quantity.dimension(), predicted * unit);
        values.put(quantity.key(), Operand.number(measure, "", "it"));
      }
    }
    List<Limit> limits = new ArrayList<>();
    Interval si = new Interval(limit.low() * unit, limit.nominal() * unit, limit.high() * unit);
    limits.add(SampleCase.limit(rule.limit().orElseThrow(), si, margin));
    StepOperands.limits(limits, values);
    StepView view =
        new StepView("1", "v", new Operands(values), limits, Optional.empty(), SampleCase.UNITS);
    RuleOutcome outcome = RuleJudging.judge(rule, view);
    return ((RuleOutcome.Found) outcome).finding().verdict();
  }

  private static double unit(Dimension dimension) {
    return switch (dimension) {
      case ABSOLUTE_PRESSURE -> 100e5;
      case PRESSURE_RATE -> 30e5 / 60;
      default -> 300;
    };
  }
}
