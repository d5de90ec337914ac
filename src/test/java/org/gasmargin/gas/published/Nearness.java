package org.gasmargin.gas.published;

import static org.junit.jupiter.api.Assertions.assertTrue;

/** Comparison of computed with published numbers. A number that is not finite is never near. */
public final class Nearness {
  private Nearness() {}

  public static void assertRelative(String what, double expected, double actual, double tolerance) {
    assertScaled(what, expected, actual, Math.abs(expected), tolerance);
  }

  /** The scale stands in where the value may pass through zero. */
  public static void assertScaled(
      String what, double expected, double actual, double scale, double tolerance) {
    assertTrue(
        Double.isFinite(actual) && Math.abs(actual - expected) <= tolerance * scale,
        () ->
            String.format(
                java.util.Locale.ROOT,
                "%s: expected %s but was %s (%.2e of the scale)",
                what,
                expected,
                actual,
                Math.abs(actual - expected) / scale));
  }
}
