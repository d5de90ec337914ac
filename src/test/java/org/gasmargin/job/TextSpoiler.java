package org.gasmargin.job;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;

/** Spoils a text by a few random edits of letters, lines and words. */
final class TextSpoiler {
  private static final List<String> PIECES =
      List.of(
          ":",
          "-",
          "{",
          "}",
          "[",
          "]",
          "\"",
          "'",
          "#",
          "&a",
          "*a",
          "!x",
          "|",
          ">",
          "%",
          "@",
          "`",
          "\t",
          "\n",
          "  ",
          ",",
          "?",
          "---\n",
          "...",
          "±",
          "bar",
          "(g)",
          "-5",
          "0",
          "1e400",
          "NaN",
          "null",
          "~",
          "<<",
          "\u0000",
          "\u202e",
          "\ud83d\ude00",
          "é",
          "999999999999999999",
          ".",
          "K");

  private final Random random;

  TextSpoiler(Random random) {
    this.random = random;
  }

  String spoil(String text) {
    String spoiled = text;
    int edits = 1 + random.nextInt(4);
    for (int i = 0; i < edits; i++) {
      spoiled = edit(spoiled);
    }
    return spoiled;
  }

  private String edit(String text) {
    int from = random.nextInt(text.length() + 1);
    int to = Math.min(text.length(), from + random.nextInt(6));
    return switch (random.nextInt(4)) {
      case 0 -> text.substring(0, from) + text.substring(to);
      case 1 -> text.substring(0, from) + piece() + text.substring(from);
      case 2 -> text.substring(0, from) + piece() + text.substring(to);
      default -> moveLine(text);
    };
  }

  private String piece() {
    return PIECES.get(random.nextInt(PIECES.size()));
  }

  private String moveLine(String text) {
    List<String> lines = new ArrayList<>(text.lines().toList());
    if (lines.isEmpty()) {
      return text;
    }
    String line = lines.remove(random.nextInt(lines.size()));
    if (random.nextBoolean()) {
      lines.add(random.nextInt(lines.size() + 1), line);
    }
    return String.join("\n", lines) + "\n";
  }
}
