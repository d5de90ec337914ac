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
import org.gasmargin.yaml.TextIssue;
import org.gasmargin.yaml.YamlNode;
import org.gasmargin.yaml.YamlNode.Mapping;
import org.gasmargin.yaml.YamlNode.Scalar;
import org.gasmargin.yaml.YamlReader;
import org.gasmargin.yaml.YamlRefused;

/** Reads one rule pack from its text. */
final class PackReader {
  private static final List<String> KEYS =
      List.of("pack", "title", "asked_by", "asked_in_words", "deference", "rules");

  private final ExpressionLanguage language;
  private final List<TextIssue> issues;

  PackReader(ExpressionLanguage language, List<TextIssue> issues) {
    this.language = language;
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
    Optional<YamlNode> root;
    try {
      root = YamlReader.read(file, text);
    } catch (YamlRefused e) {
      issues.add(e.issue());
      return Optional.empty();
    }
    if (root.isEmpty()) {
      issues.add(new TextIssue(new Place(file, 1, 1), "the file is empty"));
      return Optional.empty();
    }
    return Fields.asGroup(root.get(), "a rule pack", issues)
        .flatMap(mapping -> read(mapping, stem, text));
  }

  private Optional<RulePack> read(Mapping mapping, String stem, String text) {
    int before = issues.size();
    Fields fields = new Fields(mapping, "the rule pack", KEYS, issues);
    Optional<Scalar> name = fields.text("pack");
    if (name.isPresent() && !name.get().value().equals(stem)) {
      fields.complain(
          name.get(), "the pack of this file must be named '" + stem + "' like the file");
    }
    Optional<Scalar> title = fields.text("title");
    Optional<Scalar> deference = fields.text("deference");
    RuleReader reader =
        new RuleReader(language, stem, deference.map(Scalar::value).orElse(""), issues);
    Optional<Rule.Condition> askedBy =
        reader.condition(fields, "asked_by", "asked_in_words", Scope.GAS);
    List<Rule> rules = new ArrayList<>();
    Map<String, Scalar> seen = new HashMap<>();
    for (Mapping rule : fields.groups("rules", "rule")) {
      refuseSecond(rule, seen);
      reader.read(rule).ifPresent(rules::add);
    }
    if (issues.size() > before) {
      return Optional.empty();
    }
    return Optional.of(
        new RulePack(stem, title.orElseThrow().value(), askedBy, rules, sha256(text)));
  }

  private void refuseSecond(Mapping rule, Map<String, Scalar> seen) {
    if (rule.get("id").orElse(null) instanceof Scalar id) {
      Scalar first = seen.putIfAbsent(id.value(), id);
      if (first != null) {
        issues.add(
            new TextIssue(
                id.place(),
                "the id '" + id.value() + "' stands already in line " + first.place().line()));
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
