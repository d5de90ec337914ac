package org.gasmargin.units;

import java.util.List;

/** From where a pressure unit counts, with the marks that say so in its spelling. */
enum PressureScale {
  ABSOLUTE(Dimension.ABSOLUTE_PRESSURE, "(a)", "a", "(abs)", " abs"),
  GAUGE(Dimension.ABSOLUTE_PRESSURE, "(g)", "g", "(gauge)", " gauge"),
  DIFFERENCE(Dimension.PRESSURE_DIFFERENCE, "");

  /** Pound-force per square inch in Pa, by the definitions of pound, inch and standard gravity. */
  static final double PSI = 0.45359237 * 9.80665 / (0.0254 * 0.0254);

  private final Dimension dimension;

  @SuppressWarnings("ImmutableEnumChecker") // made by List.of
  private final List<String> marks;

  PressureScale(Dimension dimension, String... marks) {
    this.dimension = dimension;
    this.marks = List.of(marks);
  }

  Dimension dimension() {
    return dimension;
  }

  String symbol(String base) {
    return base + marks.get(0);
  }

  List<String> spellings(String base) {
    return marks.stream().map(mark -> base + mark).toList();
  }
}
