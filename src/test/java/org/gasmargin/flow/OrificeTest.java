package org.gasmargin.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.gasmargin.gas.Gas;
import org.gasmargin.gas.IdealGas;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Flow through an orifice against closed forms and real-gas critical flow. */
class OrificeTest {
  private static final Orifice UNIT_AREA = new Orifice(Math.sqrt(4 / Math.PI), 1);

  private static Gas gas(String id) {
    return new GasCatalogue().find(id).orElseThrow();
  }

  /**
   * Real-gas critical-flow function and throat pressure ratio at 20 degC. Source: largest mass flux
   * on the isentrope of the published equations of state, evaluated elsewhere; status: computed by
   * an independent implementation; tolerances 0.0005 and 0.001 are its printed digits.
   */
  @ParameterizedTest(name = "{0} at {1} bar(a)")
  @CsvSource({
    "nitrogen, 1, 0.68495, 0.5282",
    "nitrogen, 50, 0.69757, 0.5209",
    "nitrogen, 200, 0.72564, 0.4858",
    "air, 10, 0.68770, 0.5270",
    "air, 100, 0.71226, 0.5123",
    "oxygen, 100, 0.72184, 0.5170",
    "helium, 100, 0.71692, 0.4809",
    "methane, 60, 0.71486, 0.5392"
  })
  void criticalFlowFunctionOfRealGases(
      String id, double bar, double criticalFlowFunction, double throatRatio) {
    Gas gas = gas(id);
    FlowResult flow =
        UNIT_AREA.through(gas, gas.atTemperaturePressure(293.15, bar * 1e5), 0.1 * bar * 1e5);
    double computed =
        flow.massFlow()
            * Math.sqrt(Gas.MOLAR_GAS_CONSTANT * 293.15 / gas.molarMass())
            / (bar * 1e5);
    assertEquals(criticalFlowFunction, computed, 0.0005);
    assertEquals(throatRatio, flow.throatPressure() / (bar * 1e5), 0.001);
    assertTrue(flow.choked());
  }

  /**
   * Critical mass flux. Source: reference equations of state evaluated elsewhere; status: computed
   * by an independent implementation; tolerance half of the last printed digit plus the rounding of
   * its temperature, 2e-5 relative.
   */
  @ParameterizedTest(name = "{0} at {1} bar(a), {2} K")
  @CsvSource({
    "nitrogen, 150, 290, 36835, 0.499",
    "air, 300, 293, 76683, 0.459",
    "methane, 200, 293, 43322, 0.484",
    "hydrogen, 200, 293, 12221, 0.505",
    "hydrogen, 350, 294, 20966, 0.491",
    "hydrogen, 700, 300, 39775, 0.466",
    "helium, 200, 293, 18154, 0.475"
  })
  void criticalMassFluxAtHighPressure(
      String id, double bar, double kelvin, double flux, double throatRatio) {
    Gas gas = gas(id);
    FlowResult flow = UNIT_AREA.through(gas, gas.atTemperaturePressure(kelvin, bar * 1e5), 101325);
    assertEquals(flux, flow.massFlow(), 0.5 + 2e-5 * flux);
    assertEquals(throatRatio, flow.throatPressure() / (bar * 1e5), 0.0006);
  }

  /** Ideal nozzle equation; status: value from memory of the form, 0.26696 kg/s worked from it. */
  @Test
  void idealGasFlowsByTheNozzleEquation() {
    IdealGas air = IdealGas.diatomic("air", 0.0289655);
    Orifice hole = new Orifice(0.003, 0.8);
    State upstream = air.atTemperaturePressure(293.15, 200e5);
    assertEquals(0.26696, hole.through(air, upstream, 101325).massFlow(), 1e-5);
    double back = 180e5;
    double x = back / 200e5;
    double expected =
        0.8
            * hole.area()
            * 200e5
            * Math.sqrt(
                2
                    * 3.5
                    * air.molarMass()
                    / (Gas.MOLAR_GAS_CONSTANT * 293.15)
                    * (Math.pow(x, 2 / 1.4) - Math.pow(x, 2.4 / 1.4)));
    FlowResult subcritical = hole.through(air, upstream, back);
    assertEquals(expected, subcritical.massFlow(), 1e-10 * expected);
    assertFalse(subcritical.choked());
    assertEquals(
        Math.pow(2 / 2.4, 3.5), hole.through(air, upstream, 1e5).throatPressure() / 200e5, 1e-9);
  }

  @Test
  void massFlowIsContinuousAtChoking() {
    Gas nitrogen = gas("nitrogen");
    State upstream = nitrogen.atTemperaturePressure(290, 100e5);
    double critical = UNIT_AREA.through(nitrogen, upstream, 1e5).throatPressure();
    double choked = UNIT_AREA.through(nitrogen, upstream, critical * (1 - 1e-7)).massFlow();
    double open = UNIT_AREA.through(nitrogen, upstream, critical * (1 + 1e-7)).massFlow();
    assertEquals(choked, open, 1e-10 * choked);
  }

  @Test
  void nothingFlowsAgainstAnEqualOrHigherPressure() {
    Gas nitrogen = gas("nitrogen");
    State upstream = nitrogen.atTemperaturePressure(290, 2e5);
    assertEquals(0, UNIT_AREA.through(nitrogen, upstream, 2e5).massFlow(), 0);
    assertEquals(0, UNIT_AREA.through(nitrogen, upstream, 3e5).massFlow(), 0);
  }
}
