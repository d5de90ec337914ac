package org.gasmargin.rules;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.gasmargin.units.NearestName;
import org.gasmargin.yaml.TextIssue;
import org.gasmargin.yaml.YamlNode;
import org.gasmargin.yaml.YamlNode.Mapping;
import org.gasmargin.yaml.YamlNode.Scalar;
import org.gasmargin.yaml.YamlNode.Sequence;

/**
 * The keys of one group in a rule pack. What is missing, unknown or of the wrong kind becomes an
 * issue; reading goes on, so that one run finds all errors.
 */
final class Fields {
  private final Mapping mapping;
  private final String owner;
  private final List<TextIssue> issues;

  /**
   * Looks at a group and complains of keys that it does not know.
   *
   * @param mapping the group
   * @param owner whose keys they are, for messages
   * @param known the keys that may stand here
   * @param issues receives the errors
   */
  Fields(Mapping mapping, String owner, List<String> known, List<TextIssue> issues) {
    this.mapping = mapping;
    this.owner = owner;
    this.issues = issues;
    for (YamlNode.Entry entry : mapping.entries()) {
      String key = entry.key().value();
      if (!known.contains(key)) {
        String hint =
            NearestName.of(key, known)
                .map(nearest -> "; did you mean '" + nearest + "'?")
                .orElse("; the keys are " + String.join(", ", known));
        issues.add(
            new TextIssue(entry.key().place(), "unknown key '" + key + "' in " + owner + hint));
      }
    }
  }

  /** Whether a key stands here. */
  boolean has(String key) {
    return mapping.get(key).isPresent();
  }

  /** A text that must be there and not empty. */
  Optional<Scalar> text(String key) {
    Optional<Scalar> text = optionalText(key);
    if (!has(key)) {
      missing(key);
    }
    return text;
  }

  /** A text that may be left out, but not empty. */
  Optional<Scalar> optionalText(String key) {
    Optional<YamlNode> node = mapping.get(key);
    if (node.isEmpty()) {
      return Optional.empty();
    }
    if (node.get() instanceof Scalar scalar) {
      if (!scalar.value().isBlank()) {
        return Optional.of(scalar);
      }
      complain(scalar, "'" + key + "' of " + owner + " is empty");
    } else {
      complain(
          node.get(), "'" + key + "' of " + owner + " must be a text, not " + node.get().kind());
    }
    return Optional.empty();
  }

  /** A group of keys that must be there. */
  Optional<Mapping> group(String key) {
    Optional<Mapping> group = optionalGroup(key);
    if (!has(key)) {
      missing(key);
    }
    return group;
  }

  /** A group of keys that may be left out. */
  Optional<Mapping> optionalGroup(String key) {
    Optional<YamlNode> node = mapping.get(key);
    return node.flatMap(n -> asGroup(n, "'" + key + "' of " + owner, issues));
  }

  /** A list of groups that must be there and hold at least one. */
  List<Mapping> groups(String key, String item) {
    Optional<YamlNode> node = mapping.get(key);
    if (node.isEmpty()) {
      missing(key);
      return List.of();
    }
    if (!(node.get() instanceof Sequence sequence) || sequence.items().isEmpty()) {
      complain(node.get(), "'" + key + "' of " + owner + " must be a list of at least one " + item);
      return List.of();
    }
    return sequence.items().stream()
        .flatMap(n -> asGroup(n, "a " + item, issues).stream())
        .toList();
  }

  /** One of a fixed set of words. */
  <T> Optional<T> word(String key, T[] values, Function<T, String> wordOf) {
    Optional<Scalar> text = text(key);
    return text.flatMap(scalar -> wordOf(scalar, key, values, wordOf));
  }

  /** Finds the value that a word stands for; complains with the nearest if there is none. */
  <T> Optional<T> wordOf(Scalar text, String key, T[] values, Function<T, String> wordOf) {
    Optional<T> value =
        Arrays.stream(values).filter(v -> wordOf.apply(v).equals(text.value())).findFirst();
    if (value.isEmpty()) {
      List<String> words = Arrays.stream(values).map(wordOf).toList();
      String hint =
          NearestName.of(text.value(), words)
              .map(nearest -> "; did you mean '" + nearest + "'?")
              .orElse("; the words are " + String.join(", ", words));
      complain(text, "unknown " + key + " '" + text.value() + "'" + hint);
    }
    return value;
  }

  /** Adds an error at a node. */
  void complain(YamlNode node, String problem) {
    issues.add(new TextIssue(node.place(), problem));
  }

  /** Adds an error at the group itself. */
  void complain(String problem) {
    complain(mapping, problem);
  }

  /** The errors so far, to hand on. */
  List<TextIssue> issues() {
    return issues;
  }

  /** A node as a group of keys; complains if it is none. */
  static Optional<Mapping> asGroup(YamlNode node, String what, List<TextIssue> issues) {
    if (node instanceof Mapping mapping) {
      return Optional.of(mapping);
    }
    issues.add(new TextIssue(node.place(), what + " must be a group of keys, not " + node.kind()));
    return Optional.empty();
  }

  private void missing(String key) {
    complain(owner + " has no '" + key + "'");
  }
}
