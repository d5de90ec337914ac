package org.gasmargin.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuantityParserTest {
  private static final QuantityParser PARSER = new QuantityParser(Interval.exactly(1e5));

  @Test
  void gaugeCountsFromTheAtmosphereAndKeepsTheText() {
    Quantity read = PARSER.parse(" 12  bar(g) ± 1 bar ", Dimension.ABSOLUTE_PRESSURE);
    assertEquals(
        new Quantity(new Interval(12e5, 13e5, 14e5), Unit.BAR_GAUGE, "12 bar(g) ± 1 bar"), read);
  }

  @Test
  void percentageOfAGaugePressureIsOfTheReading() {
    Interval si = PARSER.parse("100 bar(g) ± 1 %", Dimension.ABSOLUTE_PRESSURE).si();
    assertEquals(new Interval(100e5, 101e5, 102e5), si);
  }

  @Test
  void toleranceOfTheAtmosphereWidensAGaugePressureOnly() {
    QuantityParser parser = new QuantityParser(new Interval(0.9e5, 1e5, 1.05e5));
    Interval gauge = parser.parse("10 bar(g) ± 1 bar", Dimension.ABSOLUTE_PRESSURE).si();
    assertEquals(9.9e5, gauge.low(), 1e-9);
    assertEquals(11e5, gauge.nominal(), 1e-9);
    assertEquals(12.05e5, gauge.high(), 1e-9);
    assertEquals(
        new Interval(9e5, 10e5, 11e5),
        parser.parse("10 bar(a) ± 1 bar", Dimension.ABSOLUTE_PRESSURE).si());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "24 degC ± 4 K",
        "24 degC +- 4 K",
        "24 degC +/- 4 K",
        "24 °C±4 °C",
        "24degC ± 7.2 degF"
      })
  void temperatureTolerancesAreDifferences(String text) {
    Interval si = PARSER.parse(text, Dimension.TEMPERATURE).si();
    assertEquals(293.15, si.low(), 1e-12);
    assertEquals(297.15, si.nominal(), 1e-12);
    assertEquals(301.15, si.high(), 1e-12);
  }

  @ParameterizedTest
  @CsvSource({
    "1e3 mm, 1",
    "1.5E+0 m, 1.5",
    "-2 m, -2",
    "−2 m, -2",
    "+2 m, 2",
    "2.50m, 2.5",
    "5e-3 m, 0.005"
  })
  void numbersFollowOneStrictGrammar(String text, double metres) {
    assertEquals(metres, PARSER.parse(text, Dimension.LENGTH).si().nominal(), 1e-15);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "12,5 L|'12,5 L' has a decimal comma; write \"12.5 L\"",
        "1,250 L|'1,250 L' does not begin with a number that can be read in one way; the decimal"
            + " mark is a point and thousands are not parted, as in 12.5 and 1250",
        "1.250,5 L|'1.250,5 L' does not begin with a number that can be read in one way; the decimal"
            + " mark is a point and thousands are not parted, as in 12.5 and 1250",
        "1 250 L|'1 250 L' holds two numbers; thousands are written without a gap, as in 1250",
        "50|'50' has no unit; write for example \"50 L\"",
        "L|'L' is not a quantity; write for example \"50 L\"",
        "NaN L|'NaN L' is not a quantity; write for example \"50 L\"",
        "1e999 L|1e999 is too large a number",
        "50 l/s|unknown unit 'l/s'; a volume is written in m3, L, dm3, mL, cm3, in3, ft3, gal(US)",
        "50 CM3|unknown unit 'CM3'; did you mean 'cm3'?",
        "50 kg|50 kg is a mass, a volume was expected; write for example \"50 L\"",
        "50 L ± 1|the tolerance '1' has no unit; write \"± 1 L\"",
        "50 L ± 1 mm|1 mm is a length, a volume was expected; write for example \"50 L\"",
        "50 L ± -1 %|a tolerance cannot be negative; write the plain amount",
        "50 L ± 1 % ± 1 %|unknown unit '% ± 1 %'; a volume is written in m3, L, dm3, mL, cm3, in3,"
            + " ft3, gal(US)",
      })
  void refusesWhatIsNotAVolume(String text, String message) {
    assertEquals(message, messageOf(text, Dimension.VOLUME));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "200 bar|200 bar is neither gauge nor absolute; write \"200 bar(g)\" or \"200 bar(a)\"",
        "3000 psi|3000 psi is neither gauge nor absolute; write \"3000 psi(g)\" or \"3000 psi(a)\"",
        "200 Bar(g)|unknown unit 'Bar(g)'; did you mean 'bar(g)'?",
        "200 BARG|unknown unit 'BARG'; did you mean 'bar(g)'?",
        "200 bar(g) ± 1 bar(g)|1 bar(g) is a point on the pressure scale, a difference was expected;"
            + " write it in bar",
        "3 min|3 min is a time, a pressure was expected; write for example \"200 bar(g)\"",
      })
  void refusesWhatIsNotAPressure(String text, String message) {
    assertEquals(message, messageOf(text, Dimension.ABSOLUTE_PRESSURE));
  }

  @Test
  void aPressureIsNoTime() {
    assertEquals(
        "3 bar is a pressure, a time was expected; write for example \"3 min\"",
        messageOf("3 bar", Dimension.TIME));
  }

  @Test
  void percentagesOfTemperaturesAndOfPercentagesAreRefused() {
    assertEquals(
        "a percentage of a temperature has no meaning; write the tolerance in K, as \"± 4 K\"",
        messageOf("24 degC ± 5 %", Dimension.TEMPERATURE));
    assertEquals(
        "'79 % ± 1 %' can be read in two ways; write both as plain numbers, as \"0.80 ± 0.02\"",
        messageOf("79 % ± 1 %", Dimension.RATIO));
  }

  @Test
  void aLongTextIsRefusedByItsLength() {
    assertEquals(
        "a text of 100000 letters is no quantity", messageOf("1".repeat(100_000), Dimension.TIME));
  }

  private static String messageOf(String text, Dimension dimension) {
    QuantityError error = assertThrows(QuantityError.class, () -> PARSER.parse(text, dimension));
    return error.problem() + error.hint().map(hint -> "; " + hint).orElse("");
  }
}
