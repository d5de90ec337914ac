package org.gasmargin.units;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DisplayUnitsTest {
  private static final DisplayUnits METRIC =
      new DisplayUnits(
          Map.of(
              Dimension.ABSOLUTE_PRESSURE, Unit.BAR_GAUGE,
              Dimension.TEMPERATURE, Unit.DEGREE_CELSIUS,
              Dimension.VOLUME, Unit.LITRE),
          101_325);

  @ParameterizedTest
  @CsvSource({
    "20041325, ABSOLUTE_PRESSURE, 199.4 bar(g)",
    "101325, ABSOLUTE_PRESSURE, 0.000 bar(g)",
    "1301325, ABSOLUTE_PRESSURE, 12.00 bar(g)",
    "101324.999, ABSOLUTE_PRESSURE, 0.0000 bar(g)",
    "250000, PRESSURE_DIFFERENCE, 2.500 bar",
    "338.15, TEMPERATURE, 65.0 degC",
    "236.66, TEMPERATURE, -36.5 degC",
    "5, TEMPERATURE_DIFFERENCE, 5.0 K",
    "0.05, VOLUME, 50 L",
    "1800, TIME, 1800 s",
    "0.123456, TIME, 0.1235 s",
    "11.8, MASS, 11.80 kg",
    "0.0114, MASS_FLOW, 0.01140 kg/s",
    "0.8, RATIO, 0.8",
    "0, RATIO, 0"
  })
  void givesEachDimensionTheDigitsItDeserves(double si, Dimension dimension, String text) {
    assertEquals(text, METRIC.format(si, dimension));
  }

  @Test
  void followsAmericanUnits() {
    DisplayUnits american =
        new DisplayUnits(
            Map.of(
                Dimension.ABSOLUTE_PRESSURE, Unit.PSI_GAUGE,
                Dimension.TEMPERATURE, Unit.DEGREE_FAHRENHEIT),
            101_325);
    assertEquals("2400 psi(g)", american.format(16_648_742.5, Dimension.ABSOLUTE_PRESSURE));
    assertEquals("9.0 degF", american.format(5, Dimension.TEMPERATURE_DIFFERENCE));
    assertEquals("14.50 psi", american.format(1e5, Dimension.PRESSURE_DIFFERENCE));
  }

  @Test
  void aValueThatIsNotFiniteShowsNoDigits() {
    assertEquals("–", METRIC.format(Double.NaN, Dimension.TEMPERATURE));
    assertEquals("–", METRIC.format(Double.POSITIVE_INFINITY, Dimension.TIME));
  }
}
