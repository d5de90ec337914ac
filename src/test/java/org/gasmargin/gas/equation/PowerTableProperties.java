package org.gasmargin.gas.equation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;

class PowerTableProperties {
  /** Whole numbers, eighths and others, as equations of state use them. */
  @Provide
  Arbitrary<double[]> exponents() {
    Arbitrary<Double> eighths = Arbitraries.integers().between(-32, 200).map(i -> i / 8.0);
    Arbitrary<Double> others = Arbitraries.doubles().between(-4, 25).ofScale(4);
    return Arbitraries.oneOf(eighths, others)
        .list()
        .ofMinSize(1)
        .ofMaxSize(40)
        .map(list -> list.stream().mapToDouble(Double::doubleValue).toArray());
  }

  @Property(tries = 500)
  void everyPlannedPowerIsThatOfTheLibrary(
      @ForAll("exponents") double[] exponents,
      @ForAll @DoubleRange(min = 0.05, max = 20) @Scale(9) double base) {
    PowerTable table = new PowerTable(exponents);
    double[] values = new double[table.size()];
    table.fill(base, values);
    for (double exponent : exponents) {
      double expected = Math.pow(base, exponent);
      assertEquals(expected, values[table.slot(exponent)], 2e-14 * expected);
    }
  }

  @Example
  void anUnplannedExponentIsAFault() {
    PowerTable table = new PowerTable(2, 3);
    assertThrows(IllegalArgumentException.class, () -> table.slot(7));
  }
}
