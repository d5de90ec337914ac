package org.gasmargin.process.bounds;

import static org.gasmargin.process.bounds.Procedures.BAR;
import static org.gasmargin.process.bounds.Procedures.bounds;
import static org.gasmargin.process.bounds.Procedures.path;
import static org.gasmargin.process.bounds.Procedures.vessel;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.gasmargin.gas.Gas;
import org.gasmargin.gas.IdealGas;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.junit.jupiter.api.Test;

/**
 * Closed forms for an ideal gas of constant heat capacity. Source: first law for open and closed
 * systems, as in any textbook; status: value from memory of the form, worked out here by hand.
 */
class IdealGasBoundsTest {
  private static final Gas DIATOMIC = IdealGas.diatomic("diatomic", 0.028);
  private static final Gas MONATOMIC = IdealGas.monatomic("monatomic", 0.004);

  /** Air of the blow-down closed forms: gamma 1.4, molar mass 28.9655 g/mol. */
  private static final Gas AIR = IdealGas.diatomic("air", 0.0289655);

  /** Nitrogen of the blow-down closed forms. */
  private static final Gas NITROGEN = IdealGas.diatomic("nitrogen", 0.0280134);

  @Test
  void chargingAnEvacuatedVesselReachesGammaTimesSupplyTemperature() {
    for (double until : new double[] {2, 20, 200}) {
      Path diatomic =
          path(
              bounds(
                  vessel(DIATOMIC, 0.05, 1e-4, 300), Procedures.fill(300 * BAR, 300, until * BAR)),
              PathKind.ADIABATIC);
      assertEquals(420.0, diatomic.last().temperature(), 1e-6);
    }
    Path monatomic =
        path(
            bounds(vessel(MONATOMIC, 0.05, 1e-4, 300), Procedures.fill(300 * BAR, 300, 100 * BAR)),
            PathKind.ADIABATIC);
    assertEquals(500.0, monatomic.last().temperature(), 1e-6);
  }

  @Test
  void chargingFromAPressureFollowsTheClosedFormInTemperatureAndMass() {
    Path path =
        path(
            bounds(vessel(DIATOMIC, 0.05, BAR, 300), Procedures.fill(300 * BAR, 300, 10 * BAR)),
            PathKind.ADIABATIC);
    assertEquals(403.846154, path.last().temperature(), 1e-5);
    assertEquals(7.42857143, path.last().mass() / path.first().mass(), 1e-7);
  }

  @Test
  void chargingByMassEndsWhereChargingToItsPressureEnds() {
    Path byPressure =
        path(
            bounds(vessel(DIATOMIC, 0.05, BAR, 300), Procedures.fill(300 * BAR, 300, 10 * BAR)),
            PathKind.ADIABATIC);
    double gained = byPressure.last().mass() - byPressure.first().mass();
    Path byMass =
        path(
            bounds(
                vessel(DIATOMIC, 0.05, BAR, 300),
                Procedures.fillByMass(300 * BAR, 300, gained / 40, 40)),
            PathKind.ADIABATIC);
    assertEquals(10 * BAR, byMass.last().pressure(), 1e-3);
    assertEquals(byPressure.last().temperature(), byMass.last().temperature(), 1e-8);
  }

  @Test
  void ventedGasLeftBehindIsIsentropic() {
    Path path =
        path(
            bounds(vessel(DIATOMIC, 0.05, 10 * BAR, 300), Procedures.vent(BAR + 1325)),
            PathKind.ADIABATIC);
    double ratio = 1.01325 / 10;
    assertEquals(300 * Math.pow(ratio, 0.4 / 1.4), path.last().temperature(), 1e-8);
    assertEquals(Math.pow(ratio, 1 / 1.4), path.last().mass() / path.first().mass(), 1e-11);
  }

  @Test
  void suddenCompressionFollowsTheIsentropeForMonatomicAndDiatomicGas() {
    double ratio = Math.pow(10, 1.4);
    Path diatomic =
        path(
            bounds(vessel(DIATOMIC, 0.001, BAR, 300), Procedures.compress(ratio * BAR)),
            PathKind.ADIABATIC);
    assertEquals(753.5659, diatomic.last().temperature(), 1e-4);
    Path monatomic =
        path(
            bounds(vessel(MONATOMIC, 0.001, BAR, 300), Procedures.compress(32 * BAR)),
            PathKind.ADIABATIC);
    assertEquals(300 * Math.pow(32, 0.4), monatomic.last().temperature(), 1e-8);
  }

  @Test
  void isothermalPathKeepsTemperatureAndAmountFollowsPressure() {
    Path path =
        path(
            bounds(vessel(DIATOMIC, 0.05, 5 * BAR, 300), Procedures.fill(300 * BAR, 340, 50 * BAR)),
            PathKind.ISOTHERMAL);
    assertEquals(300, path.peakGasTemperature(), 0);
    assertEquals(300, path.lowestGasTemperature(), 0);
    assertEquals(10, path.last().mass() / path.first().mass(), 1e-12);
  }

  /**
   * Blow-down times t = V/(Cd A C* sqrt(RT/M)) ln(p1/p2) and 2 V/((gamma-1) Cd A C* sqrt(R T1/M))
   * ((p1/p2)^((gamma-1)/(2 gamma)) - 1), choked throughout. The closed forms hold for a supply into
   * vacuum, so the pressures stay above the critical ratio. Values worked out from the forms.
   */
  @Test
  void chokedBlowDownTakesTheTimeOfTheClosedForm() {
    var air =
        bounds(vessel(AIR, 0.05, 200 * BAR, 293.15), Procedures.orificeVent(0.003, 0.8, 10 * BAR));
    assertEquals(133.35, path(air, PathKind.ISOTHERMAL).duration(), 0.01);
    assertEquals(118.88, path(air, PathKind.ADIABATIC).duration(), 0.01);
    var nitrogen =
        bounds(
            vessel(NITROGEN, 1.0, 11 * BAR, 293.15),
            Procedures.orificeVent(0.010, 0.8, 1.95 * BAR));
    double chokedFlowFunction =
        0.8
            * Math.PI
            / 4
            * 1e-4
            * 0.684731
            * Math.sqrt(Gas.MOLAR_GAS_CONSTANT * 293.15 / 0.0280134);
    assertEquals(
        Math.log(11 / 1.95) / chokedFlowFunction,
        path(nitrogen, PathKind.ISOTHERMAL).duration(),
        1e-3);
    assertEquals(
        5 * (Math.pow(11 / 1.95, 1 / 7.0) - 1) / chokedFlowFunction,
        path(nitrogen, PathKind.ADIABATIC).duration(),
        1e-3);
  }

  @Test
  void heldGasWithoutHeatExchangeDoesNotChange() {
    Path path =
        path(
            bounds(vessel(DIATOMIC, 0.05, 5 * BAR, 350), Procedures.hold(600)), PathKind.ADIABATIC);
    assertEquals(350, path.last().temperature(), 0);
    assertEquals(600, path.duration(), 0);
  }

  @Test
  void balancesCloseToRoundOff() {
    for (var step :
        new org.gasmargin.process.Step[] {
          Procedures.fill(300 * BAR, 300, 150 * BAR),
          Procedures.fillByMass(300 * BAR, 300, 0.01, 30),
          Procedures.vent(2 * BAR),
          Procedures.orificeVent(0.003, 0.8, 2 * BAR),
          Procedures.compress(100 * BAR),
          Procedures.hold(10)
        }) {
      var closure = bounds(vessel(DIATOMIC, 0.05, 20 * BAR, 300), step).closure().orElseThrow();
      assertEquals(0, closure.massRelative(), 1e-10, step.kind());
      assertEquals(0, closure.energyRelative(), 1e-10, step.kind());
    }
  }
}
