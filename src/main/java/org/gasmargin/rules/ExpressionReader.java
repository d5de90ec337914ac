package org.gasmargin.rules;

import java.util.Optional;
import org.gasmargin.units.Dimension;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;
import org.gasmargin.yaml.YamlNode;

/** Reads the expressions of a pack and checks what they give. */
final class ExpressionReader {
  private final ExpressionLanguage language;
  private final Issues issues;

  ExpressionReader(ExpressionLanguage language, Issues issues) {
    this.language = language;
    this.issues = issues;
  }

  /** A number with its dimension. */
  Optional<Expression> number(Value value, Scope scope) {
    Optional<Expression> expression = any(value, scope);
    if (expression.isPresent() && expression.get().dimension().isEmpty()) {
      issues.add(
          value.place(),
          value.path() + " is a condition, a quantity was expected",
          "write for example \"peak_pressure\" or \"K(5.0)\"");
      return Optional.empty();
    }
    return expression;
  }

  /** A condition with its words; both keys stand or neither. */
  Optional<Rule.Condition> condition(Fields fields, String whenKey, String wordsKey, Scope scope) {
    if (fields.has(whenKey) != fields.has(wordsKey)) {
      issues.add(
          fields.owner().place(),
          whenKey + " and " + wordsKey + " stand together or not at all " + fields.owner().within(),
          "the words say the condition to people");
    }
    Optional<Expression> when = fields.find(whenKey).flatMap(value -> truth(value, scope));
    Optional<String> words = fields.find(wordsKey).flatMap(value -> Texts.word(value, issues));
    return when.flatMap(expression -> words.map(text -> new Rule.Condition(expression, text)));
  }

  /** The margin that a rule asks for: a figure of the difference's dimension, zero or above. */
  Optional<Expression> margin(Value value, Optional<Dimension> predicted) {
    Optional<Expression> margin = number(value, Scope.CONSTANT);
    if (margin.isEmpty()) {
      return margin;
    }
    Dimension actual = margin.get().dimension().orElseThrow();
    Dimension expected = predicted.map(Dimension::difference).orElse(actual);
    if (expected != actual) {
      issues.add(
          value.place(),
          "the margin is " + actual.noun() + ", " + expected.noun() + " was expected");
    }
    boolean positive =
        margin.get().evaluate(Operands.NONE) instanceof Operand.Figure figure && figure.si() >= 0;
    if (!positive) {
      issues.add(value.place(), "the margin must be a finite number, zero or above");
    }
    return margin;
  }

  /** A value without any name. */
  Optional<Expression> constant(Value value) {
    return any(value, Scope.CONSTANT);
  }

  /** Complains if a limit measures something else than what is held against it. */
  void mustMatch(Value limit, Optional<Dimension> predicted, Dimension dimension) {
    if (predicted.isPresent() && predicted.get() != dimension) {
      issues.add(limit.place(), "compares " + predicted.get().noun() + " with " + dimension.noun());
    }
  }

  private Optional<Expression> truth(Value value, Scope scope) {
    Optional<Expression> expression = any(value, scope);
    Optional<Dimension> dimension = expression.flatMap(Expression::dimension);
    if (dimension.isPresent()) {
      issues.add(
          value.place(),
          value.path() + " is " + dimension.get().noun() + ", a condition was expected",
          "write for example \"step_kind == 'fill'\"");
      return Optional.empty();
    }
    return expression;
  }

  private Optional<Expression> any(Value value, Scope scope) {
    if (Texts.sentence(value, ExpressionLanguage.LONGEST, issues).isEmpty()
        || !(value.node() instanceof YamlNode.Text text)) {
      return Optional.empty();
    }
    return language.compile(text, scope, issues);
  }
}
