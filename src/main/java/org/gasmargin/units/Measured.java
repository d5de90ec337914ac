package org.gasmargin.units;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A number as typed with what stands behind it.
 *
 * @param number finite
 * @param unitText the rest of the text, may be empty
 * @param typed both
 */
record Measured(double number, String unitText, String typed) {
  private static final Pattern NUMBER =
      Pattern.compile("[+\\-\u2212]?[0-9]+(\\.[0-9]+)?([eE][+\\-\u2212]?[0-9]+)?(?![0-9.,'_])");
  private static final Pattern DECIMAL_COMMA =
      Pattern.compile("[+\\-\u2212]?[0-9]+,([0-9]{1,2}|[0-9]{4,})(?![0-9.,'_]).*");
  private static final Pattern DIGITS_FIRST = Pattern.compile("[+\\-\u2212]?[0-9].*");

  /**
   * Splits a text. A number is digits with an optional decimal point and an optional exponent, and
   * nothing that depends on the locale.
   *
   * @param example a quantity to offer when the text holds none
   */
  static Measured read(String text, String example) {
    String typed = text.strip();
    Matcher match = NUMBER.matcher(typed);
    if (!match.lookingAt()) {
      throw notANumber(typed, example);
    }
    double number = Double.parseDouble(match.group().replace('\u2212', '-'));
    if (!Double.isFinite(number)) {
      throw new QuantityError(match.group() + " is too large a number", "");
    }
    String rest = typed.substring(match.end()).strip();
    if (DIGITS_FIRST.matcher(rest).matches()) {
      throw new QuantityError(
          "'" + typed + "' holds two numbers", "thousands are written without a gap, as in 1250");
    }
    return new Measured(number, rest, typed);
  }

  private static QuantityError notANumber(String typed, String example) {
    if (DECIMAL_COMMA.matcher(typed).matches()) {
      return new QuantityError(
          "'" + typed + "' has a decimal comma", "write \"" + typed.replaceFirst(",", ".") + "\"");
    }
    if (DIGITS_FIRST.matcher(typed).matches()) {
      return new QuantityError(
          "'" + typed + "' does not begin with a number that can be read in one way",
          "the decimal mark is a point and thousands are not parted, as in 12.5 and 1250");
    }
    return new QuantityError(
        typed.isEmpty() ? "a quantity is missing here" : "'" + typed + "' is not a quantity",
        "write for example \"" + example + "\"");
  }
}
