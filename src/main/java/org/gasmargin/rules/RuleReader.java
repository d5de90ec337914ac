package org.gasmargin.rules;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.regex.Pattern;
import org.gasmargin.units.Dimension;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;

/** Reads one rule of a pack. */
final class RuleReader {
  private static final int LONGEST = 600;
  private static final Pattern IDENTIFIER = Pattern.compile("[a-z][a-z0-9_]{0,39}");

  private final ExpressionReader expressions;
  private final String pack;
  private final String deference;
  private final Issues issues;

  /**
   * A reader for the rules of one pack.
   *
   * @param expressions for the expressions
   * @param pack name of the pack, in front of every identifier
   * @param deference sentence added to every caution
   * @param issues receives every error
   */
  RuleReader(ExpressionReader expressions, String pack, String deference, Issues issues) {
    this.expressions = expressions;
    this.pack = pack;
    this.deference = deference;
    this.issues = issues;
  }

  /** The rule, or empty if anything in it is wrong. */
  Optional<Rule> read(Value value) {
    int before = issues.count();
    Optional<Fields> fields =
        Fields.of(
            value,
            issues,
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
    Optional<Rule> rule = fields.flatMap(this::read);
    return issues.count() > before ? Optional.empty() : rule;
  }

  private Optional<Rule> read(Fields fields) {
    Optional<String> id = fields.need("id").flatMap(this::identifier);
    Optional<String> title = text(fields, "title");
    Optional<Rule.Condition> condition =
        expressions.condition(fields, "applies_when", "applies_in_words", Scope.STEP);
    Optional<Rule.Predicted> predicted = fields.need("quantity").flatMap(this::predicted);
    Optional<Dimension> dimension = predicted.map(Rule.Predicted::dimension);
    Optional<LimitKind> limit = fields.find("limit").flatMap(v -> limit(v, dimension));
    Optional<DefaultLimit> defaultLimit =
        fields.find("default_limit").flatMap(v -> defaultLimit(v, dimension));
    if (!fields.has("limit") && !fields.has("default_limit")) {
      issues.add(
          fields.owner().place(),
          "the rule has neither a limit nor a default_limit",
          "write for example \"limit: max_pressure\"");
    }
    Optional<Direction> direction = choice(fields, "direction", Direction.values(), Direction::key);
    Optional<Expression> margin =
        fields.need("required_margin").flatMap(v -> expressions.margin(v, dimension));
    Optional<Severity> severity = choice(fields, "severity", Severity.values(), Severity::key);
    Optional<String> noPass = fields.find("inside_is_no_pass").flatMap(this::sentence);
    Optional<String> caution = text(fields, "caution");
    Optional<String> lookup = text(fields, "lookup");
    Optional<SourceText> source = source(fields);
    List<RuleExample> examples =
        fields
            .need("examples", "[{name: ..., given: {...}, expect: OVER LIMIT}, ...]")
            .map(v -> new ExampleReader(expressions, issues).read(v, noPass.isPresent()))
            .orElse(List.of());
    if (id.isEmpty()
        || title.isEmpty()
        || predicted.isEmpty()
        || direction.isEmpty()
        || margin.isEmpty()
        || severity.isEmpty()
        || caution.isEmpty()
        || lookup.isEmpty()
        || source.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        new Rule(
            pack + "." + id.get(),
            title.get(),
            condition,
            predicted.get(),
            limit,
            defaultLimit,
            direction.get(),
            margin.get(),
            severity.get(),
            noPass,
            caution.get() + " " + deference,
            lookup.get(),
            source.get(),
            examples));
  }

  private Optional<Rule.Predicted> predicted(Value value) {
    return Fields.of(value, issues, "name", "value")
        .flatMap(
            fields -> {
              Optional<String> name = text(fields, "name");
              Optional<Expression> number =
                  fields
                      .need("value", "peak_pressure")
                      .flatMap(v -> expressions.number(v, Scope.STEP));
              return number.flatMap(n -> name.map(words -> new Rule.Predicted(words, n)));
            });
  }

  private Optional<LimitKind> limit(Value value, Optional<Dimension> predicted) {
    Optional<LimitKind> kind =
        Texts.choice(value, "limit", LimitKind.values(), LimitKind::key, issues);
    kind.ifPresent(k -> expressions.mustMatch(value, predicted, k.dimension()));
    return kind;
  }

  private Optional<DefaultLimit> defaultLimit(Value value, Optional<Dimension> predicted) {
    return Fields.of(value, issues, "value", "source", "source_status")
        .flatMap(
            fields -> {
              Optional<Value> figure = fields.need("value", "bar_per_min(41.4)");
              Optional<Expression> number = figure.flatMap(v -> expressions.number(v, Scope.STEP));
              number
                  .flatMap(Expression::dimension)
                  .ifPresent(d -> expressions.mustMatch(figure.orElseThrow(), predicted, d));
              Optional<SourceText> source = source(fields);
              return number.flatMap(n -> source.map(s -> new DefaultLimit(n, s)));
            });
  }

  private Optional<SourceText> source(Fields fields) {
    Optional<String> words = text(fields, "source");
    Optional<SourceStatus> status =
        choice(fields, "source_status", SourceStatus.values(), SourceStatus::words);
    return words.flatMap(w -> status.map(s -> new SourceText(w, s)));
  }

  private Optional<String> identifier(Value value) {
    Optional<String> word = Texts.word(value, issues);
    if (word.filter(id -> !IDENTIFIER.matcher(id).matches()).isPresent()) {
      issues.add(
          value.place(),
          "an id is lower-case letters, digits and _, and begins with a letter",
          "write for example \"id: max_pressure\"");
      return Optional.empty();
    }
    return word;
  }

  private Optional<String> text(Fields fields, String key) {
    return fields.need(key).flatMap(this::sentence);
  }

  private Optional<String> sentence(Value value) {
    Optional<String> text = Texts.sentence(value, LONGEST, issues);
    if (text.filter(String::isEmpty).isPresent()) {
      issues.add(value.place(), value.path() + " is empty");
    }
    return text.filter(words -> !words.isEmpty());
  }

  private <T> Optional<T> choice(Fields fields, String key, T[] values, Function<T, String> word) {
    return fields.need(key).flatMap(v -> Texts.choice(v, "word", values, word, issues));
  }
}
