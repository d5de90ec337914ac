package org.gasmargin.rules;

import java.util.Arrays;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.gasmargin.units.Dimension;

/** The functions that give a figure its unit in an expression. */
enum Constant {
  K("K", Dimension.TEMPERATURE_DIFFERENCE, 1, 0),
  DEG_C("degC", Dimension.TEMPERATURE, 1, 273.15),
  BAR("bar", Dimension.PRESSURE_DIFFERENCE, 1e5, 0),
  BAR_A("bar_a", Dimension.ABSOLUTE_PRESSURE, 1e5, 0),
  S("s", Dimension.TIME, 1, 0),
  MIN("min", Dimension.TIME, 60, 0),
  BAR_PER_MIN("bar_per_min", Dimension.PRESSURE_RATE, 1e5 / 60, 0);

  private static final Pattern FIGURE =
      Pattern.compile("(\\w+)\\((-?[0-9]+(?:\\.[0-9]+)?(?:[eE][+-]?[0-9]+)?)\\)");

  private final String key;
  private final Dimension dimension;
  private final double factor;
  private final double offset;

  Constant(String key, Dimension dimension, double factor, double offset) {
    this.key = key;
    this.dimension = dimension;
    this.factor = factor;
    this.offset = offset;
  }

  /** The name of the function. */
  String key() {
    return key;
  }

  /** What the figure becomes. */
  Dimension dimension() {
    return dimension;
  }

  /** The figure in SI. */
  Measure of(double figure) {
    return new Measure(dimension, figure * factor + offset);
  }

  /** Reads a figure with its unit, as in {@code K(5.0)}; empty if the text is anything else. */
  static Optional<Measure> parse(String text) {
    Matcher match = FIGURE.matcher(text.strip());
    if (!match.matches()) {
      return Optional.empty();
    }
    return Arrays.stream(values())
        .filter(constant -> constant.key.equals(match.group(1)))
        .map(constant -> constant.of(Double.parseDouble(match.group(2))))
        .findFirst();
  }
}
