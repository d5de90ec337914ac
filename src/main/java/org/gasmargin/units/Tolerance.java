package org.gasmargin.units;

/** The half width behind a plus-minus sign. */
final class Tolerance {
  private Tolerance() {}

  /**
   * Half width in SI, zero or above.
   *
   * @param text what stands behind the sign
   * @param value what stands before it
   * @param unit the unit of the value
   */
  static double halfWidth(String text, Measured value, Unit unit) {
    Unit difference = unit.difference();
    Measured tolerance = Measured.read(text, "± " + difference.dimension().example());
    if (tolerance.number() < 0) {
      throw new QuantityError("a tolerance cannot be negative", "write the plain amount");
    }
    if (tolerance.unitText().isEmpty() && unit.dimension() != Dimension.RATIO) {
      throw new QuantityError(
          "the tolerance '" + tolerance.typed() + "' has no unit",
          "write \"± " + tolerance.typed() + " " + difference.symbol() + "\"");
    }
    boolean percent = tolerance.unitText().equals(Unit.PERCENT.symbol());
    if (percent && unit.dimension() == Dimension.TEMPERATURE) {
      throw new QuantityError(
          "a percentage of a temperature has no meaning", "write the tolerance in K, as \"± 4 K\"");
    }
    if (percent && unit == Unit.PERCENT) {
      throw new QuantityError(
          "'" + value.typed() + " ± " + tolerance.typed() + "' can be read in two ways",
          "write both as plain numbers, as \"0.80 ± 0.02\"");
    }
    if (percent) {
      return Math.abs(value.number()) * tolerance.number() / 100 * difference.toSi(1, 0);
    }
    return UnitChoice.of(tolerance, difference.dimension()).toSi(tolerance.number(), 0);
  }
}
