package org.gasmargin.rules;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.NearestName;
import org.gasmargin.yaml.TextIssue;
import org.gasmargin.yaml.YamlNode;
import org.gasmargin.yaml.YamlNode.Mapping;
import org.gasmargin.yaml.YamlNode.Scalar;

/** Reads the examples of a rule. */
final class ExampleReader {
  private static final List<String> KEYS = List.of("name", "given", "expect");

  private final ExpressionLanguage language;
  private final List<TextIssue> issues;

  ExampleReader(ExpressionLanguage language, List<TextIssue> issues) {
    this.language = language;
    this.issues = issues;
  }

  /**
   * The examples of a rule; complains if a kind is missing.
   *
   * @param neverPasses whether the rule cannot end WITHIN LIMITS
   */
  List<RuleExample> read(Fields rule, boolean neverPasses) {
    List<RuleExample> examples = new ArrayList<>();
    for (Mapping mapping : rule.groups("examples", "example")) {
      readOne(mapping).ifPresent(examples::add);
    }
    Set<Verdict> wanted = new TreeSet<>(Set.of(Verdict.OVER_LIMIT, Verdict.NOT_ASSESSED));
    if (!neverPasses) {
      wanted.add(Verdict.WITHIN_LIMITS);
    }
    examples.forEach(example -> example.expected().ifPresent(wanted::remove));
    if (!wanted.isEmpty() && rule.has("examples")) {
      rule.complain(
          "the rule has no example that ends "
              + String.join(" or ", wanted.stream().map(Verdict::words).toList()));
    }
    return examples;
  }

  private Optional<RuleExample> readOne(Mapping mapping) {
    Fields fields = new Fields(mapping, "the example", KEYS, issues);
    Optional<Scalar> name = fields.text("name");
    Map<String, Operand> given = new HashMap<>();
    fields
        .group("given")
        .ifPresent(group -> group.entries().forEach(entry -> readOperand(entry, given)));
    Optional<Scalar> expect = fields.text("expect");
    if (expect.isEmpty() || name.isEmpty()) {
      return Optional.empty();
    }
    if (expect.get().value().equals(RuleExample.DOES_NOT_APPLY)) {
      return Optional.of(new RuleExample(name.get().value(), given, Optional.empty()));
    }
    return fields
        .wordOf(expect.get(), "verdict", Verdict.values(), Verdict::words)
        .map(verdict -> new RuleExample(name.get().value(), given, Optional.of(verdict)));
  }

  private void readOperand(YamlNode.Entry entry, Map<String, Operand> given) {
    String name = entry.key().value();
    if (!Vocabulary.canBeGiven(name)) {
      String hint =
          NearestName.of(name, Vocabulary.all())
              .map(nearest -> "; did you mean '" + nearest + "'?")
              .orElse("");
      issues.add(new TextIssue(entry.key().place(), "unknown name '" + name + "'" + hint));
    } else if (!(entry.value() instanceof Scalar text)) {
      issues.add(
          new TextIssue(entry.value().place(), "'" + name + "' must have a value on its line"));
    } else if (Vocabulary.isWord(name)) {
      given.put(name, new Operand.Word(text.value()));
    } else {
      language
          .compile(text, Scope.CONSTANT, issues)
          .ifPresent(value -> put(name, text, value, given));
    }
  }

  private void put(String name, Scalar text, Expression value, Map<String, Operand> given) {
    Optional<Dimension> expected = Vocabulary.dimension(name);
    if (!value.dimension().equals(expected)) {
      issues.add(
          new TextIssue(
              text.place(),
              "'"
                  + name
                  + "' is "
                  + expected.map(Dimension::noun).orElse("a condition")
                  + ", not "
                  + value.dimension().map(Dimension::noun).orElse("a condition")));
      return;
    }
    given.put(name, value.evaluate(Operands.NONE));
  }
}
