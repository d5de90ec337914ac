package org.gasmargin.rules;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.units.Place;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Lists;
import org.gasmargin.yaml.Printable;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;
import org.gasmargin.yaml.YamlDocument;
import org.gasmargin.yaml.YamlNode;
import org.gasmargin.yaml.YamlNode.Field;

/** Reads one rule pack from its text. */
final class PackReader {
  private static final int MOST_RULES = 200;

  private final ExpressionReader expressions;
  private final Issues issues;

  PackReader(ExpressionLanguage language, Issues issues) {
    this.expressions = new ExpressionReader(language, issues);
    this.issues = issues;
  }

  /**
   * The pack, or empty if anything in it is wrong.
   *
   * @param file name for messages
   * @param stem the name that the pack must have
   * @param text whole file
   */
  Optional<RulePack> read(String file, String stem, String text) {
    int before = issues.count();
    Place top = new Place(file, 1, 1);
    Optional<YamlNode> root = YamlDocument.read(file, text, issues);
    if (root.isEmpty() && issues.count() == before) {
      issues.add(top, "the file holds no rule pack", "begin with \"pack: " + stem + "\"");
    }
    Optional<RulePack> pack =
        root.flatMap(
                node ->
                    Fields.of(
                        new Value("", top, node),
                        issues,
                        "pack",
                        "title",
                        "asked_by",
                        "asked_in_words",
                        "deference",
                        "rules"))
            .flatMap(fields -> read(fields, stem, text));
    return issues.count() > before ? Optional.empty() : pack;
  }

  private Optional<RulePack> read(Fields fields, String stem, String text) {
    fields.need("pack", stem).ifPresent(value -> mustBeNamed(value, stem));
    Optional<String> title = fields.need("title").flatMap(value -> Texts.word(value, issues));
    Optional<String> deference =
        fields.need("deference").flatMap(value -> Texts.word(value, issues));
    Optional<Rule.Condition> askedBy =
        expressions.condition(fields, "asked_by", "asked_in_words", Scope.GAS);
    RuleReader reader = new RuleReader(expressions, stem, deference.orElse(""), issues);
    List<Rule> rules = new ArrayList<>();
    Map<String, Place> seen = new HashMap<>();
    for (Value item :
        fields
            .need("rules")
            .map(list -> Lists.items(list, 1, MOST_RULES, issues))
            .orElse(List.of())) {
      refuseSecond(item, seen);
      reader.read(item).ifPresent(rules::add);
    }
    return title.map(words -> new RulePack(stem, words, askedBy, rules, sha256(text)));
  }

  private void mustBeNamed(Value value, String stem) {
    Optional<String> name = Texts.word(value, issues);
    if (name.filter(word -> !word.equals(stem)).isPresent()) {
      issues.add(
          value.place(),
          "the pack has another name than its file",
          "write \"pack: " + stem + "\" or name the file " + name.get() + ".yaml");
    }
  }

  private void refuseSecond(Value rule, Map<String, Place> seen) {
    if (!(rule.node() instanceof YamlNode.Table table)) {
      return;
    }
    Optional<YamlNode> id = Optional.ofNullable(table.fields().get("id")).map(Field::value);
    if (id.orElse(null) instanceof YamlNode.Text text) {
      Place first = seen.putIfAbsent(text.value(), text.place());
      if (first != null) {
        issues.add(
            text.place(),
            "the id "
                + Printable.quote(text.value())
                + " stands here a second time, first at line "
                + first.line(),
            "every rule of a pack has its own id");
      }
    }
  }

  private static String sha256(String text) {
    try {
      MessageDigest digest = MessageDigest.getInstance("SHA-256");
      return HexFormat.of().formatHex(digest.digest(text.getBytes(StandardCharsets.UTF_8)));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }
}
