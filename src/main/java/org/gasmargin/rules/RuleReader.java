package org.gasmargin.rules;

import java.util.List;
import java.util.Optional;
import org.gasmargin.units.Dimension;
import org.gasmargin.yaml.TextIssue;
import org.gasmargin.yaml.YamlNode.Mapping;
import org.gasmargin.yaml.YamlNode.Scalar;

/** Reads one rule of a pack. */
final class RuleReader {
  private static final List<String> KEYS =
      List.of(
          "id",
          "title",
          "applies_when",
          "applies_in_words",
          "quantity",
          "direction",
          "limit",
          "default_limit",
          "required_margin",
          "inside_is_no_pass",
          "severity",
          "caution",
          "lookup",
          "source",
          "source_status",
          "examples");
  private static final List<String> QUANTITY_KEYS = List.of("name", "value");
  private static final List<String> DEFAULT_KEYS = List.of("value", "source", "source_status");

  private final ExpressionLanguage language;
  private final String pack;
  private final String deference;
  private final List<TextIssue> issues;

  /**
   * A reader for the rules of one pack.
   *
   * @param language for expressions
   * @param pack name of the pack, in front of every identifier
   * @param deference sentence added to every caution
   * @param issues receives every error
   */
  RuleReader(ExpressionLanguage language, String pack, String deference, List<TextIssue> issues) {
    this.language = language;
    this.pack = pack;
    this.deference = deference;
    this.issues = issues;
  }

  /** The rule, or empty if anything in it is wrong. */
  Optional<Rule> read(Mapping mapping) {
    int before = issues.size();
    Fields fields = new Fields(mapping, "the rule", KEYS, issues);
    Optional<String> id = fields.text("id").flatMap(scalar -> identifier(fields, scalar));
    String title = value(fields.text("title"));
    Optional<Rule.Condition> condition =
        condition(fields, "applies_when", "applies_in_words", Scope.STEP);
    Optional<Mapping> quantityGroup = fields.group("quantity");
    Optional<Fields> quantityFields =
        quantityGroup.map(group -> new Fields(group, "the quantity", QUANTITY_KEYS, issues));
    String quantityName = value(quantityFields.flatMap(q -> q.text("name")));
    Optional<Scalar> quantityText = quantityFields.flatMap(q -> q.text("value"));
    Optional<Expression> quantity = quantityText.flatMap(text -> number(text, Scope.STEP));
    Optional<Direction> direction = fields.word("direction", Direction.values(), Direction::key);
    Optional<LimitKind> limit =
        fields
            .optionalText("limit")
            .flatMap(text -> fields.wordOf(text, "limit", LimitKind.values(), LimitKind::key));
    Optional<DefaultLimit> defaultLimit = defaultLimit(fields, quantity);
    if (!fields.has("limit") && !fields.has("default_limit")) {
      fields.complain("the rule has neither 'limit' nor 'default_limit'");
    }
    limit.ifPresent(kind -> sameDimension(fields, "limit", quantity, kind.dimension()));
    Optional<Expression> requiredMargin = requiredMargin(fields, quantity);
    Optional<Severity> severity = fields.word("severity", Severity.values(), Severity::key);
    Optional<String> insideIsNoPass = fields.optionalText("inside_is_no_pass").map(Scalar::value);
    String caution = value(fields.text("caution"));
    String lookup = value(fields.text("lookup"));
    String source = value(fields.text("source"));
    Optional<SourceStatus> status =
        fields.word("source_status", SourceStatus.values(), SourceStatus::words);
    List<RuleExample> examples =
        new ExampleReader(language, issues).read(fields, insideIsNoPass.isPresent());
    if (issues.size() > before) {
      return Optional.empty();
    }
    return Optional.of(
        new Rule(
            pack + "." + id.orElseThrow(),
            title,
            condition,
            quantityName,
            quantity.orElseThrow(),
            limit,
            defaultLimit,
            direction.orElseThrow(),
            requiredMargin.orElseThrow(),
            severity.orElseThrow(),
            insideIsNoPass,
            caution + " " + deference,
            lookup,
            source,
            status.orElseThrow(),
            examples));
  }

  /** Reads a condition with its words; both keys stand or neither. */
  Optional<Rule.Condition> condition(Fields fields, String whenKey, String wordsKey, Scope scope) {
    Optional<Scalar> when = fields.optionalText(whenKey);
    Optional<Scalar> words = fields.optionalText(wordsKey);
    if (fields.has(whenKey) != fields.has(wordsKey)) {
      fields.complain("'" + whenKey + "' and '" + wordsKey + "' stand together or not at all");
    }
    Optional<Expression> expression = when.flatMap(text -> language.compile(text, scope, issues));
    if (expression.isPresent() && expression.get().dimension().isPresent()) {
      fields.complain(
          when.orElseThrow(),
          "'"
              + whenKey
              + "' gives "
              + expression.get().dimension().get().noun()
              + "; a condition was expected, as in step_kind == 'fill'");
      return Optional.empty();
    }
    return expression.flatMap(e -> words.map(w -> new Rule.Condition(e, w.value())));
  }

  private Optional<DefaultLimit> defaultLimit(Fields fields, Optional<Expression> quantity) {
    Optional<Mapping> group = fields.optionalGroup("default_limit");
    if (group.isEmpty()) {
      return Optional.empty();
    }
    Fields own = new Fields(group.get(), "the default limit", DEFAULT_KEYS, issues);
    Optional<Expression> value = own.text("value").flatMap(text -> number(text, Scope.STEP));
    String source = value(own.text("source"));
    Optional<SourceStatus> status =
        own.word("source_status", SourceStatus.values(), SourceStatus::words);
    value
        .flatMap(Expression::dimension)
        .ifPresent(dimension -> sameDimension(own, "value", quantity, dimension));
    return value.flatMap(v -> status.map(s -> new DefaultLimit(v, source, s)));
  }

  private Optional<Expression> requiredMargin(Fields fields, Optional<Expression> quantity) {
    Optional<Scalar> text = fields.text("required_margin");
    Optional<Expression> margin = text.flatMap(scalar -> number(scalar, Scope.CONSTANT));
    if (margin.isEmpty()) {
      return Optional.empty();
    }
    Optional<Dimension> expected =
        quantity.flatMap(Expression::dimension).map(Arithmetic::differenceOf);
    Dimension actual = margin.get().dimension().orElseThrow();
    if (expected.isPresent() && !expected.get().equals(actual)) {
      fields.complain(
          text.orElseThrow(),
          "the margin is " + actual.noun() + "; " + expected.get().noun() + " was expected");
    }
    if (!(margin.get().evaluate(Operands.NONE) instanceof Operand.Figure figure)
        || figure.si() < 0) {
      fields.complain(text.orElseThrow(), "the margin must be a finite number, zero or above");
    }
    return margin;
  }

  private Optional<Expression> number(Scalar text, Scope scope) {
    Optional<Expression> expression = language.compile(text, scope, issues);
    if (expression.isPresent() && expression.get().dimension().isEmpty()) {
      issues.add(
          new TextIssue(
              text.place(),
              "'" + text.value() + "' is a condition; a quantity was expected, as in K(5.0)"));
      return Optional.empty();
    }
    return expression;
  }

  private static void sameDimension(
      Fields fields, String key, Optional<Expression> quantity, Dimension dimension) {
    Optional<Dimension> predicted = quantity.flatMap(Expression::dimension);
    if (predicted.isPresent() && !predicted.get().equals(dimension)) {
      fields.complain(
          fields.text(key).orElseThrow(),
          "compares " + predicted.get().noun() + " with " + dimension.noun());
    }
  }

  private static Optional<String> identifier(Fields fields, Scalar text) {
    if (text.value().matches("[a-z][a-z0-9_]*")) {
      return Optional.of(text.value());
    }
    fields.complain(text, "an id is lower-case letters, digits and _, beginning with a letter");
    return Optional.empty();
  }

  private static String value(Optional<Scalar> text) {
    return text.map(Scalar::value).orElse("");
  }
}
