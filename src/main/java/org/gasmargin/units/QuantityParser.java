package org.gasmargin.units;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads quantities such as {@code 50 L ± 1 %}, {@code 24 degC ± 4 K} or {@code 12 bar(g) ± 1 bar}.
 *
 * <p>A tolerance is written after {@code ±}, {@code +-} or {@code +/-}, in a unit of difference or
 * as a percentage of the number as typed, so for a gauge pressure of the gauge reading. A
 * percentage of a temperature point has no meaning and is refused.
 */
public final class QuantityParser {
  private static final Pattern PLUS_MINUS = Pattern.compile("\u00b1|\\+/-|\\+-");
  private static final int LONGEST = 80;

  private final Interval atmosphere;

  /**
   * @param atmosphere atmospheric pressure, Pa absolute; its tolerance widens a gauge pressure
   */
  public QuantityParser(Interval atmosphere) {
    this.atmosphere = atmosphere;
  }

  /**
   * Reads a quantity of a dimension.
   *
   * @throws QuantityError if the text is anything else
   */
  public Quantity parse(String text, Dimension expected) {
    String typed = text.strip().replaceAll("\\s+", " ");
    if (typed.length() > LONGEST) {
      throw new QuantityError("a text of " + typed.length() + " letters is no quantity", "");
    }
    Matcher sign = PLUS_MINUS.matcher(typed);
    boolean tolerant = sign.find();
    Measured value =
        Measured.read(tolerant ? typed.substring(0, sign.start()) : typed, expected.example());
    Unit unit = UnitChoice.of(value, expected);
    double half = tolerant ? Tolerance.halfWidth(typed.substring(sign.end()), value, unit) : 0;
    double low = unit.toSi(value.number(), atmosphere.low()) - half;
    double high = unit.toSi(value.number(), atmosphere.high()) + half;
    if (!Double.isFinite(low) || !Double.isFinite(high)) {
      throw new QuantityError(typed + " is too large a number", "");
    }
    return new Quantity(
        new Interval(low, unit.toSi(value.number(), atmosphere.nominal()), high), unit, typed);
  }
}
