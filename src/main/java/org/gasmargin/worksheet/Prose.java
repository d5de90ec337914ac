package org.gasmargin.worksheet;

/** Tidies sentences that other parts of the program made. */
final class Prose {
  private Prose() {}

  /** The text with printed unit symbols. */
  static String tidy(String text) {
    return text.strip().replace("degC", "°C").replace("degF", "°F");
  }

  /** A sentence that goes on after a colon: without its capital, unless a name or unit needs it. */
  static String continued(String sentence) {
    boolean word = sentence.length() > 1 && Character.isLowerCase(sentence.charAt(1));
    return word ? Character.toLowerCase(sentence.charAt(0)) + sentence.substring(1) : sentence;
  }

  /** The text as a sentence: a capital first and a full stop last. */
  static String sentence(String text) {
    String tidy = tidy(text);
    if (tidy.isEmpty()) {
      return tidy;
    }
    int first = tidy.codePointAt(0);
    String capital =
        Character.toString(Character.toUpperCase(first))
            + tidy.substring(Character.charCount(first));
    char last = capital.charAt(capital.length() - 1);
    return last == '.' || last == '?' || last == '!' ? capital : capital + ".";
  }
}
