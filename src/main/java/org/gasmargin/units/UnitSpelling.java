package org.gasmargin.units;

import java.text.Normalizer;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;

/** Brings the many ways to write one unit into the few that {@link Unit} lists. */
final class UnitSpelling {
  private UnitSpelling() {}

  /**
   * Superscripts become digits, multiplication dots become spaces, {@code deg C} becomes {@code
   * degC}, and spaces around brackets and strokes go. Capitals stay as they are: mPa is not MPa.
   */
  static String normal(String typed) {
    return Normalizer.normalize(typed, Normalizer.Form.NFKC)
        .replaceAll("[·⋅∙*]", " ")
        .replace("^", "")
        .replaceAll("\\s+", " ")
        .replaceAll(" ?([()/]) ?", "$1")
        .replaceAll("^(deg|°) ?([CFR])$", "deg$2")
        .strip();
  }

  /** The units of other dimensions that are spelled so. */
  static List<Unit> elsewhere(String spelling, Dimension expected) {
    String normal = normal(spelling);
    return Arrays.stream(Unit.values())
        .filter(unit -> unit.dimension() != expected && unit.spellings().contains(normal))
        .toList();
  }

  /** The printed symbols of a dimension, for example {@code s, ms, min, h}. */
  static String choices(Dimension dimension) {
    return Arrays.stream(Unit.values())
        .filter(unit -> unit.dimension() == dimension && !unit.symbol().isEmpty())
        .map(Unit::symbol)
        .collect(Collectors.joining(", "));
  }

  /** The symbol of the unit whose spelling is nearest to a misspelled one. */
  static Optional<String> nearest(String misspelled, Dimension dimension) {
    String normal = normal(misspelled);
    Set<Unit> units = new LinkedHashSet<>();
    for (Unit unit : Unit.values()) {
      if (unit.dimension() == dimension
          && unit.spellings().stream().anyMatch(normal::equalsIgnoreCase)) {
        units.add(unit);
      }
    }
    return units.stream().findFirst().map(Unit::symbol);
  }
}
