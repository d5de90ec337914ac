package org.gasmargin.yaml;

import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.regex.Pattern;
import org.gasmargin.units.NearestName;

/** Reads values that are words or sentences. */
public final class Texts {
  /** Most letters of a usual text. */
  public static final int LONGEST = 200;

  private static final Pattern NAME = Pattern.compile("\\p{L}[\\p{L}\\p{N}_-]{0,39}");

  private Texts() {}

  /** A text of one line and usual length, possibly empty if it stands in quotes. */
  public static Optional<String> sentence(Value value, Issues issues) {
    return sentence(value, LONGEST, issues);
  }

  /** A text of one line and at most so many letters, possibly empty if it stands in quotes. */
  public static Optional<String> sentence(Value value, int longest, Issues issues) {
    if (!(value.node() instanceof YamlNode.Text text) || text.isMissing()) {
      issues.add(
          value.place(),
          "a text was expected for " + value.path() + ", not " + value.node().noun());
      return Optional.empty();
    }
    if (text.value().codePointCount(0, text.value().length()) > longest) {
      issues.add(value.place(), value.path() + " is longer than " + longest + " letters");
      return Optional.empty();
    }
    if (Printable.hasHidden(text.value())) {
      issues.add(
          value.place(), value.path() + " holds a line break or a character that cannot be seen");
      return Optional.empty();
    }
    return Optional.of(text.value().strip());
  }

  /** A text that is not empty. */
  public static Optional<String> word(Value value, Issues issues) {
    Optional<String> text = sentence(value, issues);
    if (text.filter(String::isEmpty).isPresent()) {
      issues.add(value.place(), value.path() + " is empty");
    }
    return text.filter(letters -> !letters.isEmpty());
  }

  /**
   * One of some words.
   *
   * @param what the words are, for messages
   */
  public static Optional<String> choice(
      Value value, String what, Collection<String> words, Issues issues) {
    return word(value, issues)
        .flatMap(
            typed -> {
              if (!words.contains(typed)) {
                unknown(value, what, typed, words, issues);
                return Optional.empty();
              }
              return Optional.of(typed);
            });
  }

  /**
   * One of some values that have a word each.
   *
   * @param what the words are, for messages
   */
  public static <T> Optional<T> choice(
      Value value, String what, T[] values, Function<T, String> word, Issues issues) {
    List<String> words = Arrays.stream(values).map(word).toList();
    return choice(value, what, words, issues).map(typed -> values[words.indexOf(typed)]);
  }

  /** {@code true} or {@code false}. */
  public static Optional<Boolean> truth(Value value, Issues issues) {
    if (value.node() instanceof YamlNode.Text text
        && !text.quoted()
        && text.value().matches("true|True|TRUE|false|False|FALSE")) {
      return Optional.of(Boolean.valueOf(text.value()));
    }
    issues.add(
        value.place(),
        "true or false was expected for " + value.path() + ", not " + value.node().noun());
    return Optional.empty();
  }

  /** Adds the issue of a name that is not known, with what was probably meant. */
  public static void unknown(
      Value value, String what, String typed, Collection<String> known, Issues issues) {
    String choices = String.join(", ", known.stream().sorted().toList());
    issues.add(
        value.place(),
        "unknown " + what + " " + Printable.quote(typed) + " for " + value.path(),
        NearestName.of(typed, known)
            .map(name -> "did you mean '" + name + "'?")
            .orElse(choices.isEmpty() ? "there is none to choose from" : "known are " + choices));
  }

  /** Whether a name that the user chose for a vessel or supply can be printed and referred to. */
  public static boolean isName(Value named, String name, Issues issues) {
    boolean good = NAME.matcher(name).matches();
    if (!good) {
      issues.add(
          named.key(),
          Printable.quote(name) + " cannot be a name",
          "names begin with a letter and hold letters, digits, _ and -, at most 40");
    }
    return good;
  }
}
