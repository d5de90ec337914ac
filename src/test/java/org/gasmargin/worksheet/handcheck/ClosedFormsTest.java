package org.gasmargin.worksheet.handcheck;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.gasmargin.gas.Gas;
import org.junit.jupiter.api.Test;

/**
 * The closed forms against worked numbers. Unless a test says otherwise: formula from memory
 * (textbook), value computed by independent arithmetic.
 */
class ClosedFormsTest {
  private static final double R = Gas.MOLAR_GAS_CONSTANT;
  private static final double GAMMA = 1.4;

  @Test
  void constantPressureTakesWorkAndHeat() {
    IdealChange change = IdealChange.isobaric(2 * R, GAMMA, 100);
    assertWithin(1e-4, 1662.89, change.work());
    assertWithin(1e-4, 5820.12, change.heat());
    assertWithin(1e-4, 4157.23, change.energyRise());
  }

  @Test
  void constantVolumeTakesHeatAlone() {
    IdealChange change = IdealChange.isochoric(2 * R, GAMMA, 60);
    assertEquals(0, change.work());
    assertWithin(1e-4, 2494.34, change.heat());
    assertWithin(1e-4, 12.000, 10 * 360.0 / 300);
  }

  @Test
  void constantTemperatureTurnsHeatIntoWork() {
    IdealChange change = IdealChange.isothermal(R * 300, 5);
    assertWithin(1e-4, 4014.48, change.work());
    assertEquals(change.work(), change.heat());
    assertEquals(0, change.energyRise());
  }

  /** Status: published; worked example of an encyclopaedia, 2.51 MPa. */
  @Test
  void litreOfAirCompressedTenfoldReachesPublishedPressure() {
    double ratio = Math.pow(10, GAMMA);
    assertWithin(1e-3, 2.51, 0.1 * ratio);
    assertWithin(1e-4, 2.5119, 0.1 * ratio);
    assertWithin(1e-4, 753.57, IdealChange.temperature(300, ratio, GAMMA));
    assertWithin(1e-4, 0.1, IdealChange.volumeRatio(ratio, GAMMA));
  }

  @Test
  void adiabaticCompressionTakesWork() {
    double p2 = 1e5 * Math.pow(10, GAMMA);
    IdealChange change = IdealChange.adiabatic(1e5 * 1e-3, p2 * 1e-4, GAMMA);
    assertWithin(1e-4, -377.972, change.work());
    assertEquals(0, change.heat());
  }

  @Test
  void polytropicCompressionGivesOffHeat() {
    double end = IdealChange.temperature(300, 8, 1.25);
    assertWithin(2e-4, 454.71, end);
    IdealChange change = IdealChange.polytropic(R, GAMMA, 1.25, 300, end);
    assertWithin(2e-4, -5145.49, change.work());
    assertWithin(2e-4, -1929.56, change.heat());
  }

  @Test
  void evacuatedVesselFillsToGammaTimesTheSupply() {
    assertWithin(1e-4, 420.00, RigidVessel.chargedTemperature(GAMMA, 300, 250, 0));
  }

  @Test
  void chargeFromOneToTenBar() {
    double end = RigidVessel.chargedTemperature(GAMMA, 300, 300, 0.1);
    assertEquals(403.846, end, 0.01);
    assertWithin(1e-4, 7.42857, RigidVessel.massRatio(10, 300, end));
  }

  @Test
  void chargeByMassAgreesWithChargeByPressure() {
    double end = RigidVessel.chargedTemperature(GAMMA, 310, 290, 0.2);
    double ratio = RigidVessel.massRatio(5, 290, end);
    assertWithin(1e-12, end, RigidVessel.chargedTemperatureByMass(GAMMA, 310, 290, ratio));
  }

  @Test
  void ventFromTenToOneBar() {
    assertWithin(1e-4, 155.38, IdealChange.temperature(300, 0.1, GAMMA));
    assertWithin(1e-4, 0.19307, RigidVessel.massLeft(GAMMA, 0.1));
  }

  /** A fill held at the temperature of its supply gives off the work (p2 - p1) V of the main. */
  @Test
  void isothermalChargeGivesOffPressureRiseTimesVolume() {
    assertWithin(1e-12, -9.5e5, RigidVessel.heatOfIsothermalCharge(GAMMA, 300, 300, 190e5, 0.05));
  }

  /** Adiabatic to a fifth of the volume, cooled at constant volume, expanded isothermally. */
  @Test
  void workOfAClosedCycleIsItsHeat() {
    double n = 1e5 * 1e-3 / 300;
    double hot = 300 * Math.pow(5, GAMMA - 1);
    double work =
        IdealChange.adiabatic(n * 300, n * hot, GAMMA).work()
            + IdealChange.isothermal(n * 300, 5).work();
    double heat =
        IdealChange.isochoric(n, GAMMA, 300 - hot).heat()
            + IdealChange.isothermal(n * 300, 5).heat();
    assertWithin(1e-4, -64.9697, work);
    assertWithin(1e-4, -64.9697, heat);
  }

  private static void assertWithin(double relative, double expected, double computed) {
    assertEquals(expected, computed, Math.abs(relative * expected));
  }
}
