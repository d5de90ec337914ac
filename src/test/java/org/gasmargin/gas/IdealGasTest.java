package org.gasmargin.gas;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class IdealGasTest {
  private static final double BAR = 1e5;
  private static final IdealGas NITROGEN = IdealGas.diatomic("ideal-nitrogen", 0.0280134);

  /** Kinetic theory; status: formula from memory, exact. */
  @Test
  void heatCapacitiesAreThoseOfKineticTheory() {
    State diatomic = NITROGEN.at(300, 40);
    assertEquals(20.78616, diatomic.cv(), 1e-5);
    assertEquals(29.10062, diatomic.cp(), 1e-5);
    State monatomic = IdealGas.monatomic("ideal-helium", 0.0040026).at(300, 40);
    assertEquals(12.47169, monatomic.cv(), 1e-5);
    assertEquals(20.78616, monatomic.cp(), 1e-5);
  }

  /**
   * Isentropes. First row: encyclopaedia worked example, 1 L at 100 kPa and 300 K to 0.1 L, status:
   * published. Second: Irodov, General Physics, problem 2.39 (560 K printed), status: published.
   * Others: closed form, status: formula from memory.
   */
  @ParameterizedTest
  @CsvSource({
    "300, 1, 25.119, 753.57, 0.03",
    "290, 1, 10, 559.90, 0.005",
    "293.15, 200, 50, 197.28, 0.005",
    "293.15, 11, 1.01325, 148.31, 0.005"
  })
  void isentropeEndsWhereTheClosedFormDoes(
      double t1, double bar1, double bar2, double t2, double tolerance) {
    State start = NITROGEN.atTemperaturePressure(t1, bar1 * BAR);
    State end = NITROGEN.atPressureEntropy(bar2 * BAR, start.entropy());
    assertEquals(t2, end.temperature(), tolerance);
    State again = NITROGEN.atDensityEntropy(end.molarDensity(), start.entropy());
    assertEquals(end.temperature(), again.temperature(), 1e-10);
  }

  /** p/T constant; status: formula from memory. */
  @ParameterizedTest
  @CsvSource({"200, 15, 65, 234.70", "200, 65, 15, 170.43"})
  void pressureOfAClosedVesselFollowsTheTemperature(
      double bar, double t1, double t2, double expected) {
    State filled = NITROGEN.atTemperaturePressure(t1 + 273.15, bar * BAR);
    assertEquals(expected, NITROGEN.at(t2 + 273.15, filled.molarDensity()).pressure() / BAR, 0.005);
  }

  @Test
  void eachWayLeadsToTheSameState() {
    State s = NITROGEN.atTemperaturePressure(321, 17 * BAR);
    assertEquals(
        321, NITROGEN.atDensityEnergy(s.molarDensity(), s.internalEnergy(), 1).temperature(), 1e-9);
    assertEquals(
        321, NITROGEN.atDensityPressure(s.molarDensity(), s.pressure()).temperature(), 1e-9);
    assertEquals(321, NITROGEN.atPressureEnthalpy(s.pressure(), s.enthalpy()).temperature(), 1e-9);
    assertEquals(1.4, s.isentropicExponent(), 1e-12);
    assertEquals(0, s.dudRho(), 1e-12);
    assertEquals(s.enthalpy(), s.internalEnergy() + s.pressure() / s.molarDensity(), 1e-9);
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, 0, -1})
  void unusableNumbersAreRefused(double bad) {
    assertThrows(OutsideValidity.class, () -> NITROGEN.at(bad, 40));
    assertThrows(OutsideValidity.class, () -> NITROGEN.at(300, bad));
    assertThrows(OutsideValidity.class, () -> NITROGEN.atTemperaturePressure(bad, BAR));
    assertThrows(OutsideValidity.class, () -> NITROGEN.atTemperaturePressure(300, bad));
    assertThrows(OutsideValidity.class, () -> NITROGEN.atDensityEnergy(40, bad, 300));
    assertThrows(OutsideValidity.class, () -> NITROGEN.atDensityPressure(bad, BAR));
    assertThrows(OutsideValidity.class, () -> NITROGEN.atPressureEnthalpy(BAR, bad));
    assertThrows(OutsideValidity.class, () -> NITROGEN.atPressureEntropy(bad, 0));
    assertThrows(OutsideValidity.class, () -> NITROGEN.atDensityEntropy(bad, 0));
    assertThrows(OutsideValidity.class, () -> NITROGEN.idealCp(bad));
  }

  @Test
  void transportIsRefusedUntilGiven() {
    State s = NITROGEN.at(300, 40);
    assertThrows(OutsideValidity.class, () -> NITROGEN.viscosity(s));
    Gas withTransport = NITROGEN.withTransport(1.8e-5, 0.026);
    assertEquals(1.8e-5, withTransport.viscosity(s));
    assertEquals(0.026, withTransport.thermalConductivity(s));
  }
}
