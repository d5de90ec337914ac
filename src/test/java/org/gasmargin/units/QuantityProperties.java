package org.gasmargin.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.StringLength;

class QuantityProperties {
  private static final double ATMOSPHERE = 98_765.4;
  private static final QuantityParser PARSER = new QuantityParser(Interval.exactly(ATMOSPHERE));

  @Property(seed = "20261")
  void everyNumberInEveryUnitIsReadBackAsPrinted(
      @ForAll Unit unit, @ForAll @DoubleRange(min = -1e6, max = 1e6) double number) {
    Quantity read = PARSER.parse(number + " " + unit.symbol(), unit.dimension());
    assertEquals(unit.toSi(number, ATMOSPHERE), read.si().nominal());
    assertEquals(unit, read.unit());
    assertTrue(read.si().isExact());
  }

  @Property(seed = "20261")
  void convertingThereAndBackChangesNothing(
      @ForAll Unit unit, @ForAll @DoubleRange(min = -1e6, max = 1e6) double number) {
    double back = unit.fromSi(unit.toSi(number, ATMOSPHERE), ATMOSPHERE);
    double roundOff =
        1e-14 * Math.abs(unit.toSi(number, ATMOSPHERE)) / unit.difference().toSi(1, 0);
    assertEquals(number, back, 1e-14 * Math.abs(number) + roundOff + 1e-10);
  }

  @Property(seed = "20261")
  void whatIsDisplayedIsReadAsTheSameValueToTheDigitsShown(
      @ForAll Unit unit, @ForAll @DoubleRange(min = 0.5, max = 1e6) double number) {
    double si = unit.toSi(number, ATMOSPHERE);
    String shown = DisplayUnits.of(unit, ATMOSPHERE).format(si, unit.dimension());
    double read = PARSER.parse(shown, unit.dimension()).si().nominal();
    double finestPressure = unit.symbol().contains("Pa") ? 5 : 0;
    double halfDigit =
        Math.max(5.1e-4 * number, 0.051) * unit.difference().toSi(1, 0) + finestPressure;
    assertEquals(si, read, halfDigit, shown);
  }

  @Property(seed = "20261")
  void tolerancesHoldTheValueBetweenTheirEnds(
      @ForAll Unit unit,
      @ForAll @DoubleRange(min = -1e6, max = 1e6) double number,
      @ForAll @DoubleRange(min = 0, max = 1e3) double tolerance) {
    if (unit == Unit.PERCENT) {
      return;
    }
    Unit difference = unit.difference();
    Interval si =
        PARSER
            .parse(
                number + " " + unit.symbol() + " ± " + tolerance + " " + difference.symbol(),
                unit.dimension())
            .si();
    double half = difference.toSi(tolerance, ATMOSPHERE);
    assertEquals(si.nominal() - half, si.low(), 1e-9 * Math.abs(si.nominal()) + 1e-12);
    assertEquals(si.nominal() + half, si.high(), 1e-9 * Math.abs(si.nominal()) + 1e-12);
  }

  @Property(seed = "20261")
  void anyTextIsAQuantityOrAOneLineError(
      @ForAll @StringLength(max = 100) String text, @ForAll Dimension dimension) {
    try {
      assertTrue(Double.isFinite(PARSER.parse(text, dimension).si().nominal()));
    } catch (QuantityError e) {
      assertTrue(e.problem().length() > 5);
    }
  }

  @Property(seed = "20261")
  void nearMissesOfQuantitiesAreNeverMoreThanAnError(
      @ForAll Unit unit,
      @ForAll Dimension dimension,
      @ForAll @DoubleRange(min = 0, max = 100) double number,
      @ForAll @StringLength(max = 3) String noise) {
    for (String text :
        new String[] {
          number + noise + unit.symbol(),
          number + " " + unit.symbol() + noise,
          noise + number + " " + unit.symbol() + " ± " + noise
        }) {
      anyTextIsAQuantityOrAOneLineError(text, dimension);
    }
  }
}
