package org.gasmargin.rules;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.gasmargin.units.Dimension;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Lists;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;

/** Reads the examples of a rule. */
final class ExampleReader {
  private static final int MOST = 50;
  private static final List<String> OUTCOMES =
      Stream.concat(
              Stream.of(Verdict.values()).map(Verdict::words),
              Stream.of(RuleExample.DOES_NOT_APPLY))
          .toList();
  private static final List<String> GIVEN =
      Vocabulary.all().stream().filter(Vocabulary::canBeGiven).toList();

  private final ExpressionReader expressions;
  private final Issues issues;

  ExampleReader(ExpressionReader expressions, Issues issues) {
    this.expressions = expressions;
    this.issues = issues;
  }

  /**
   * The examples of a rule; complains if a kind of outcome is missing.
   *
   * @param neverPasses whether the rule cannot end WITHIN LIMITS
   */
  List<RuleExample> read(Value list, boolean neverPasses) {
    List<RuleExample> examples = new ArrayList<>();
    int before = issues.count();
    for (Value item : Lists.items(list, 1, MOST, issues)) {
      readOne(item).ifPresent(examples::add);
    }
    Set<Verdict> wanted =
        neverPasses
            ? EnumSet.of(Verdict.OVER_LIMIT, Verdict.NOT_ASSESSED)
            : EnumSet.of(Verdict.WITHIN_LIMITS, Verdict.OVER_LIMIT, Verdict.NOT_ASSESSED);
    examples.forEach(example -> example.expected().ifPresent(wanted::remove));
    if (!wanted.isEmpty() && issues.count() == before) {
      issues.add(
          list.key(),
          "no example ends "
              + wanted.stream().map(Verdict::words).collect(Collectors.joining(" or ")),
          "a rule is shown by at least one example of each outcome");
    }
    return examples;
  }

  private Optional<RuleExample> readOne(Value item) {
    Optional<Fields> fields = Fields.of(item, issues, "name", "given", "expect");
    if (fields.isEmpty()) {
      return Optional.empty();
    }
    Optional<String> name = fields.get().need("name").flatMap(v -> Texts.word(v, issues));
    Map<String, Operand> given = new HashMap<>();
    fields
        .get()
        .need("given", "{peak_pressure: bar_a(198.0)}")
        .flatMap(v -> Fields.named(v, issues))
        .ifPresent(all -> all.all().forEach((key, v) -> readOperand(key, v, given)));
    Optional<String> expected =
        fields
            .get()
            .need("expect", "OVER LIMIT")
            .flatMap(v -> Texts.choice(v, "outcome", OUTCOMES, issues));
    return name.flatMap(n -> expected.map(word -> new RuleExample(n, given, verdict(word))));
  }

  private static Optional<Verdict> verdict(String word) {
    return Stream.of(Verdict.values()).filter(v -> v.words().equals(word)).findFirst();
  }

  private void readOperand(String name, Value value, Map<String, Operand> given) {
    if (!Vocabulary.canBeGiven(name)) {
      Texts.unknown(value, "name", name, GIVEN, issues);
    } else if (Vocabulary.isWord(name)) {
      Texts.word(value, issues).ifPresent(word -> given.put(name, new Operand.Word(word)));
    } else {
      expressions.constant(value).ifPresent(figure -> put(name, value, figure, given));
    }
  }

  private void put(String name, Value value, Expression figure, Map<String, Operand> given) {
    Optional<Dimension> expected = Vocabulary.dimension(name);
    if (figure.dimension().equals(expected)) {
      given.put(name, figure.evaluate(Operands.NONE));
    } else {
      issues.add(
          value.place(), name + " is " + noun(expected) + ", not " + noun(figure.dimension()));
    }
  }

  private static String noun(Optional<Dimension> dimension) {
    return dimension.map(Dimension::noun).orElse("a condition");
  }
}
