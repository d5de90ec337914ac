package org.gasmargin.gas.helmholtz;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;

/** What is refused says why in plain words, with quantity, value, unit and range. */
class RefusalTest {
  private static final GasCatalogue CATALOGUE = new GasCatalogue();
  private static final Gas NITROGEN = CATALOGUE.find("nitrogen").orElseThrow();

  private static void assertRefused(String words, Executable way) {
    assertEquals(words, assertThrows(OutsideValidity.class, way).getMessage());
  }

  @Test
  void temperatureOutOfRange() {
    assertRefused(
        "nitrogen at 2500.00 K is outside the range of its equation of state, 63.1510 K to 2000.00 K",
        () -> NITROGEN.at(2500, 40));
  }

  @Test
  void pressureOutOfRange() {
    assertRefused(
        "oxygen at 1000.00 bar(a) is outside the range of its equation of state, above 0 to 800.000"
            + " bar(a)",
        () -> CATALOGUE.find("oxygen").orElseThrow().atTemperaturePressure(300, 1e8));
  }

  @Test
  void densityOutOfRange() {
    assertRefused(
        "nitrogen at a density of 60000.0 mol/m3 is outside the range of its equation of state, above"
            + " 0 to 47500.0 mol/m3",
        () -> NITROGEN.at(300, 60_000));
  }

  @Test
  void twoPhases() {
    assertRefused(
        "nitrogen at 100.000 K would begin to condense: at this temperature it is gas up to 7.78275"
            + " bar(a), 1140.92 mol/m3, and liquid from 24607.9 mol/m3",
        () -> NITROGEN.at(100, 10_000));
  }

  @Test
  void condensingAir() {
    assertRefused(
        "air at 100.000 K would begin to condense: only gas is modelled, at this temperature up to"
            + " 5.50401 bar(a)",
        () -> CATALOGUE.find("air").orElseThrow().atTemperaturePressure(100, 1e6));
  }

  @Test
  void solid() {
    assertRefused(
        "nitrogen at 100.000 K and 5000.00 bar(a) is solid: at this temperature it is fluid up to"
            + " 2045.88 bar(a)",
        () -> NITROGEN.atTemperaturePressure(100, 5e8));
  }

  @Test
  void hotterThanTheRangeOnAnIsentrope() {
    Gas argon = CATALOGUE.find("argon").orElseThrow();
    double entropy = argon.atTemperaturePressure(293.15, 101_325).entropy();
    assertRefused(
        "argon would be hotter than 2000.00 K, where the range of its equation of state ends",
        () -> argon.atPressureEntropy(20_265_000, entropy));
  }

  @Test
  void conductivityOfColdHelium() {
    Gas helium = CATALOGUE.find("helium").orElseThrow();
    assertRefused(
        "the correlation of the thermal conductivity of helium begins at 12.0000 K, asked was 10.0000"
            + " K",
        () -> helium.thermalConductivity(helium.atTemperaturePressure(10, 1e5)));
  }

  @Test
  void condensingWhereGasAloneIsAskedFor() {
    Gas carbonDioxide = CATALOGUE.findGas("CO2").orElseThrow();
    assertRefused(
        "carbon dioxide at 293.150 K would begin to condense: only gas is modelled, at this"
            + " temperature up to 57.2905 bar(a)",
        () -> carbonDioxide.atTemperaturePressure(293.15, 80e5));
    assertRefused(
        "carbon dioxide at 293.150 K would begin to condense: only gas is modelled, at this"
            + " temperature up to 57.2905 bar(a)",
        () -> carbonDioxide.at(293.15, 18_000));
  }

  @Test
  void transportWithoutACorrelation() {
    Gas neon = CATALOGUE.find("neon").orElseThrow();
    State state = neon.atTemperaturePressure(300, 1e5);
    assertRefused(
        "no correlation of the viscosity of neon is carried, so it is unknown",
        () -> neon.viscosity(state));
    assertRefused(
        "no correlation of the thermal conductivity of neon is carried, so it is unknown",
        () -> neon.thermalConductivity(state));
  }

  @Test
  void coldWaterFromDensityAndPressure() {
    Gas water = CATALOGUE.find("water").orElseThrow();
    State cold = water.atTemperaturePressure(275, 1e6);
    assertRefused(
        "water at a density of 55530.0 mol/m3: its pressure first falls and then rises as it warms,"
            + " so that density and pressure do not settle the temperature",
        () -> water.atDensityPressure(cold.molarDensity(), 1e6));
  }

  /** The one point at which the terms around the critical point have no derivatives. */
  @Test
  void criticalPointItselfIsNoUsableState() {
    Gas carbonDioxide = CATALOGUE.find("CO2").orElseThrow();
    assertThrows(OutsideValidity.class, () -> carbonDioxide.at(304.1282, 10_624.9063));
  }
}
