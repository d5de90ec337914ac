package org.gasmargin.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.HashSet;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class UnitTest {
  /** Source and status of the rows stand at the head of the file. */
  @ParameterizedTest
  @CsvFileSource(resources = "/published/unit-definitions.csv")
  void convertsByThePublishedDefinitions(
      String typed, Dimension dimension, double si, double relativeTolerance) {
    QuantityParser parser = new QuantityParser(Interval.exactly(101_325));
    double read = parser.parse(typed, dimension).si().nominal();
    assertTrue(
        Math.abs(read - si) <= relativeTolerance * Math.abs(si), typed + " was read as " + read);
  }

  @ParameterizedTest
  @CsvSource({
    "barg, BAR_GAUGE",
    "bar (g), BAR_GAUGE",
    "bar(gauge), BAR_GAUGE",
    "bar gauge, BAR_GAUGE",
    "bara, BAR_ABSOLUTE",
    "bar(abs), BAR_ABSOLUTE",
    "bar abs, BAR_ABSOLUTE",
    "psig, PSI_GAUGE",
    "psi(g), PSI_GAUGE",
    "psia, PSI_ABSOLUTE",
    "kPa(a), KILOPASCAL_ABSOLUTE",
    "MPa(g), MEGAPASCAL_GAUGE",
    "Pa(a), PASCAL_ABSOLUTE",
    "mbar(a), MILLIBAR_ABSOLUTE",
    "atm(a), ATMOSPHERE_ABSOLUTE"
  })
  void readsTheUsualMarksOfGaugeAndAbsolute(String spelling, Unit unit) {
    assertEquals(unit, Unit.find(spelling, Dimension.ABSOLUTE_PRESSURE).orElseThrow());
  }

  @ParameterizedTest
  @CsvSource({
    "W/(m² K), FILM_COEFFICIENT",
    "W/(m²·K), FILM_COEFFICIENT",
    "W/m^2/K, FILM_COEFFICIENT",
    "W/(m·K), CONDUCTIVITY",
    "W / (m K), CONDUCTIVITY",
    "W/mK, CONDUCTIVITY",
    "J/(kg·K), HEAT_CAPACITY",
    "kJ/kgK, HEAT_CAPACITY",
    "kg/m³, DENSITY",
    "dm³, VOLUME",
    "°C, TEMPERATURE",
    "℃, TEMPERATURE",
    "deg C, TEMPERATURE",
    "° F, TEMPERATURE",
    "m², AREA"
  })
  void readsSuperscriptsDotsAndDegreeSigns(String spelling, Dimension dimension) {
    assertTrue(Unit.find(spelling, dimension).isPresent());
  }

  @Test
  void capitalsMatterSoThatMilliIsNotMega() {
    assertTrue(Unit.find("mPa(a)", Dimension.ABSOLUTE_PRESSURE).isEmpty());
    assertTrue(Unit.find("KPA(a)", Dimension.ABSOLUTE_PRESSURE).isEmpty());
  }

  @Test
  void noSpellingMeansTwoUnitsOfOneDimension() {
    for (Dimension dimension : Dimension.values()) {
      Set<String> seen = new HashSet<>();
      Arrays.stream(Unit.values())
          .filter(unit -> unit.dimension() == dimension)
          .flatMap(unit -> unit.spellings().stream())
          .forEach(spelling -> assertTrue(seen.add(spelling), spelling));
    }
  }

  @ParameterizedTest
  @EnumSource(Unit.class)
  void everyUnitIsFoundUnderWhatItPrints(Unit unit) {
    assertEquals(unit, Unit.find(unit.symbol(), unit.dimension()).orElseThrow());
  }

  @ParameterizedTest
  @EnumSource(Unit.class)
  void differencesAreCountedWithoutZeroPoint(Unit unit) {
    Unit difference = unit.difference();
    assertEquals(0, difference.toSi(0, 101_325));
    assertEquals(
        unit.toSi(3, 101_325) - unit.toSi(2, 101_325),
        difference.toSi(1, 101_325),
        1e-9 * unit.toSi(3, 101_325));
  }

  @Test
  void everyDimensionHasAnExampleThatReads() {
    QuantityParser parser = new QuantityParser(Interval.exactly(101_325));
    for (Dimension dimension : Dimension.values()) {
      assertEquals(dimension, parser.parse(dimension.example(), dimension).unit().dimension());
    }
  }
}
