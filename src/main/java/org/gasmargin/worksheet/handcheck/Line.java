package org.gasmargin.worksheet.handcheck;

/**
 * One line of a hand check.
 *
 * @param symbol what is computed, for example {@code T₂}
 * @param formula in symbols; for a given number, where it comes from
 * @param filledIn the formula with printed numbers; empty for a given number
 * @param result the printed result
 * @param unit of the result; may be empty
 */
public record Line(String symbol, String formula, String filledIn, Rounded result, String unit) {

  /** A number that is given. */
  static Line given(String symbol, String origin, Rounded value, String unit) {
    return new Line(symbol, origin, "", value, unit);
  }
}
