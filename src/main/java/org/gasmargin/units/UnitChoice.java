package org.gasmargin.units;

import java.util.List;
import java.util.Optional;

/** Finds the unit of a value, or says why what was typed is none. */
final class UnitChoice {
  private UnitChoice() {}

  static Unit of(Measured value, Dimension expected) {
    return Unit.find(value.unitText(), expected).orElseThrow(() -> mistake(value, expected));
  }

  private static QuantityError mistake(Measured value, Dimension expected) {
    String typed = value.typed();
    if (value.unitText().isEmpty()) {
      return new QuantityError(
          "'" + typed + "' has no unit", "write for example \"" + expected.example() + "\"");
    }
    List<Unit> elsewhere = UnitSpelling.elsewhere(value.unitText(), expected);
    if (elsewhere.isEmpty()) {
      return unknown(value, expected);
    }
    Unit found = elsewhere.get(0);
    if (expected == Dimension.ABSOLUTE_PRESSURE
        && found.dimension() == Dimension.PRESSURE_DIFFERENCE) {
      return new QuantityError(
          typed + " is neither gauge nor absolute",
          "write \"" + typed + "(g)\" or \"" + typed + "(a)\"");
    }
    if (expected == Dimension.PRESSURE_DIFFERENCE
        && found.dimension() == Dimension.ABSOLUTE_PRESSURE) {
      return new QuantityError(
          typed + " is a point on the pressure scale, a difference was expected",
          "write it in " + found.difference().symbol());
    }
    return new QuantityError(
        typed + " is " + noun(found) + ", " + expected.noun() + " was expected",
        "write for example \"" + expected.example() + "\"");
  }

  private static String noun(Unit unit) {
    return switch (unit.dimension()) {
      case PRESSURE_DIFFERENCE -> Dimension.ABSOLUTE_PRESSURE.noun();
      case RATIO -> "a percentage";
      default -> unit.dimension().noun();
    };
  }

  private static QuantityError unknown(Measured value, Dimension expected) {
    Optional<String> nearest = UnitSpelling.nearest(value.unitText(), expected);
    return new QuantityError(
        "unknown unit '" + value.unitText() + "'",
        nearest
            .map(symbol -> "did you mean '" + symbol + "'?")
            .orElse(expected.noun() + " is written in " + UnitSpelling.choices(expected)));
  }
}
