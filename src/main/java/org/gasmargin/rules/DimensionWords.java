package org.gasmargin.rules;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.gasmargin.units.Dimension;

/** Says in plain words which dimensions do not go together. */
final class DimensionWords {
  private static final Pattern NO_OVERLOAD =
      Pattern.compile(
          "found no matching overload for '([^']*)' applied to '\\(([^)]*)\\)'.*", Pattern.DOTALL);

  private DimensionWords() {}

  /** The words for a message of the checker. */
  static String of(String message) {
    Matcher match = NO_OVERLOAD.matcher(message);
    if (!match.matches()) {
      return message.lines().findFirst().orElse(message);
    }
    List<String> nouns =
        Arrays.stream(match.group(2).split(",")).map(type -> noun(type.strip())).toList();
    return sentence(match.group(1), nouns) + advice(match.group(1), match.group(2));
  }

  private static String advice(String function, String types) {
    if (function.equals("_==_") || function.equals("_!=_")) {
      return "; == and != are for words and conditions, numbers take <, <=, > or >=";
    }
    return types.contains("int") && !Character.isLetter(function.charAt(0))
        ? "; write a number with a decimal point, as in 2.0"
        : "";
  }

  private static String sentence(String function, List<String> nouns) {
    String left = nouns.get(0);
    String right = nouns.get(nouns.size() - 1);
    return switch (function) {
      case "_<_", "_<=_", "_>_", "_>=_", "_==_", "_!=_" -> "compares " + left + " with " + right;
      case "_+_" -> "adds " + left + " and " + right;
      case "_-_" -> "subtracts " + right + " from " + left;
      case "_*_" -> "multiplies " + left + " by " + right;
      case "_/_" -> "divides " + left + " by " + right;
      case "_&&_", "_||_" -> "joins " + left + " with " + right + " where two conditions belong";
      case "!_" -> "negates " + left + " where a condition belongs";
      case "-_" -> "puts a minus before " + left;
      case "_?_:_" -> "chooses by ?: between unlike values or without a condition";
      default -> function + "(...) takes one number, as in " + function + "(5.0), not " + left;
    };
  }

  /** The noun for a type of the checker. */
  static String noun(String type) {
    return switch (type) {
      case "double", "int" -> "a plain number";
      case "bool" -> "a condition";
      case "string" -> "a word";
      default ->
          Arrays.stream(Dimension.values())
              .filter(dimension -> dimension.name().equals(type.toUpperCase(Locale.ROOT)))
              .map(Dimension::noun)
              .findFirst()
              .orElse(type);
    };
  }
}
