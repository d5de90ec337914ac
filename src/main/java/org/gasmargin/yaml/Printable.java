package org.gasmargin.yaml;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.gasmargin.units.Place;

/** Text of unknown origin made harmless for a terminal and a page. */
public final class Printable {
  /** Control characters, broken surrogates, line separators and marks that turn the direction. */
  public static final String HIDDEN =
      "[\\p{Cc}\\p{Cs}\\p{Zl}\\p{Zp}\\u202A-\\u202E\\u2066-\\u2069\\uFEFF]";

  private static final Pattern HIDDEN_CHARACTER = Pattern.compile(HIDDEN);
  private static final Pattern CONTROL = Pattern.compile("[\\p{Cc}\\p{Cs}&&[^\t\n\r]]");
  private static final int LONGEST_LINE = 400;
  private static final int LONGEST_QUOTE = 40;

  private Printable() {}

  /** The text on one line, without characters that cannot be seen. */
  public static String line(String text) {
    String clean = HIDDEN_CHARACTER.matcher(text).replaceAll("?");
    return clean.length() <= LONGEST_LINE ? clean : clean.substring(0, LONGEST_LINE) + "...";
  }

  /** The text in quotes, shortened to what a message can bear. */
  public static String quote(String text) {
    return "'"
        + (text.length() <= LONGEST_QUOTE ? text : text.substring(0, LONGEST_QUOTE) + "...")
        + "'";
  }

  /** Whether a text holds a character that cannot be seen. */
  public static boolean hasHidden(String text) {
    return HIDDEN_CHARACTER.matcher(text).find();
  }

  /**
   * Whether a file holds a control character other than line ends and tabs; adds an issue if so.
   */
  public static boolean findsControl(String file, String text, Issues issues) {
    Matcher control = CONTROL.matcher(text);
    if (!control.find()) {
      return false;
    }
    String before = text.substring(0, control.start());
    int line = (int) before.chars().filter(letter -> letter == '\n').count() + 1;
    int start = before.lastIndexOf('\n') + 1;
    issues.add(
        new Place(file, line, before.codePointCount(start, before.length()) + 1),
        String.format(
            Locale.ROOT,
            "the character U+%04X cannot stand in such a file",
            control.group().codePointAt(0)));
    return true;
  }
}
