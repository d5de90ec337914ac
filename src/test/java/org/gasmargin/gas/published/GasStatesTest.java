package org.gasmargin.gas.published;

import static org.gasmargin.gas.published.Nearness.assertRelative;
import static org.gasmargin.gas.published.Nearness.assertScaled;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.gas.published.PublishedTable.Row;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * States, processes and saturation of the pure gases against tables of an independent
 * implementation (status: computed by an independent implementation; source in the head of each
 * table). Agreement shows that the arithmetic is right; the uncertainty of the equations remains.
 */
class GasStatesTest {
  private static final double TOLERANCE = 1e-9;

  /** Saturation: as far as the table itself is asked for. */
  private static final double SATURATION_TOLERANCE = 1e-8;

  private static final GasCatalogue CATALOGUE = new GasCatalogue();

  static Stream<Row> states() {
    return PublishedTable.rows("gas-states").filter(row -> !isTwoPhase(row, "phase"));
  }

  static Stream<Row> mixturesOfGasAndLiquid() {
    return PublishedTable.rows("gas-states").filter(row -> isTwoPhase(row, "phase"));
  }

  private static boolean isTwoPhase(Row row, String column) {
    return row.text(column).equals("two-phase");
  }

  static Stream<Row> saturation() {
    return PublishedTable.rows("gas-saturation");
  }

  static Stream<Row> isentropes() {
    return PublishedTable.rows("gas-isentropes");
  }

  static Stream<Row> isochores() {
    return PublishedTable.rows("gas-isochores");
  }

  static Stream<Row> charging() {
    return PublishedTable.rows("gas-charging");
  }

  static Stream<Row> venting() {
    return PublishedTable.rows("gas-venting");
  }

  private static Gas gas(Row row) {
    return CATALOGUE.find(row.text("gas")).orElseThrow();
  }

  @ParameterizedTest
  @MethodSource("states")
  void stateAndTransportAgreeWithTheTable(Row row) {
    Gas gas = gas(row);
    double t = row.number("T");
    State state = gas.at(t, row.number("rho"));
    double r = Gas.MOLAR_GAS_CONSTANT;
    assertRelative("p", row.number("p"), state.pressure(), TOLERANCE);
    assertEnergy("u", row.number("u"), state.internalEnergy(), t);
    assertEnergy("h", row.number("h"), state.enthalpy(), t);
    assertScaled(
        "s", row.number("s"), state.entropy(), Math.max(r, Math.abs(state.entropy())), TOLERANCE);
    assertRelative("cv", row.number("cv"), state.cv(), TOLERANCE);
    assertRelative("cp", row.number("cp"), state.cp(), TOLERANCE);
    assertRelative("w", row.number("w"), state.speedOfSound(), TOLERANCE);
    if (row.has("viscosity")) {
      assertRelative("viscosity", row.number("viscosity"), gas.viscosity(state), TOLERANCE);
    }
    if (row.has("conductivity")) {
      assertRelative(
          "conductivity", row.number("conductivity"), gas.thermalConductivity(state), TOLERANCE);
    }
  }

  private static void assertEnergy(String what, double expected, double actual, double t) {
    double scale = Math.max(Math.abs(expected), Gas.MOLAR_GAS_CONSTANT * t);
    assertScaled(what, expected, actual, scale, TOLERANCE);
  }

  @ParameterizedTest
  @MethodSource("states")
  void densityOfAPressureAgreesWithTheTable(Row row) {
    State state = gas(row).atTemperaturePressure(row.number("T"), row.number("p"));
    assertRelative("rho", row.number("rho"), state.molarDensity(), TOLERANCE);
  }

  /** Equilibrium of gas and liquid is no single state: refused from every pair of properties. */
  @ParameterizedTest
  @MethodSource("mixturesOfGasAndLiquid")
  void mixtureOfGasAndLiquidIsRefused(Row row) {
    double t = row.number("T");
    double rho = row.number("rho");
    double p = row.number("p");
    double u = row.number("u");
    double h = row.number("h");
    double s = row.number("s");
    for (Gas gas : List.of(gas(row), CATALOGUE.findGas(row.text("gas")).orElseThrow())) {
      assertRefused(() -> gas.at(t, rho));
      assertRefused(() -> gas.atDensityEnergy(rho, u, t));
      assertRefused(() -> gas.atDensityEnergy(rho, u, 2 * t));
      assertRefused(() -> gas.atDensityPressure(rho, p));
      assertRefused(() -> gas.atDensityEntropy(rho, s));
      assertRefused(() -> gas.atPressureEntropy(p, s));
      assertRefused(() -> gas.atPressureEnthalpy(p, h));
    }
  }

  private static void assertRefused(Executable way) {
    String words = assertThrows(OutsideValidity.class, way).toString();
    assertTrue(words.contains("would begin to condense"), words);
  }

  @ParameterizedTest
  @MethodSource("saturation")
  void bothSidesOfTheSaturationPressureAgreeWithTheTable(Row row) {
    Gas gas = gas(row);
    double t = row.number("T");
    double p = row.number("psat");
    // A hair on either side of the published pressure: the stable phase changes there.
    double hair = 1e-11;
    State vapour = gas.atTemperaturePressure(t, p * (1 - hair));
    State liquid = gas.atTemperaturePressure(t, p * (1 + hair));
    assertRelative("rhoV", row.number("rhoV"), vapour.molarDensity(), SATURATION_TOLERANCE);
    assertRelative("rhoL", row.number("rhoL"), liquid.molarDensity(), SATURATION_TOLERANCE);
    double rt = Gas.MOLAR_GAS_CONSTANT * t;
    assertScaled("hV", row.number("hV"), vapour.enthalpy(), rt, SATURATION_TOLERANCE);
    assertScaled("hL", row.number("hL"), liquid.enthalpy(), rt, SATURATION_TOLERANCE);
    assertScaled(
        "sV", row.number("sV"), vapour.entropy(), Gas.MOLAR_GAS_CONSTANT, SATURATION_TOLERANCE);
    assertScaled(
        "sL", row.number("sL"), liquid.entropy(), Gas.MOLAR_GAS_CONSTANT, SATURATION_TOLERANCE);
  }

  @ParameterizedTest
  @MethodSource("isentropes")
  void isentropesAgreeWithTheTableOrAreRefused(Row row) {
    Gas gas = gas(row);
    State start = gas.atTemperaturePressure(row.number("T1"), row.number("p1"));
    assertRelative("rho1", row.number("rho1"), start.molarDensity(), TOLERANCE);
    assertScaled("s1", row.number("s1"), start.entropy(), Gas.MOLAR_GAS_CONSTANT, TOLERANCE);
    double p2 = row.number("p2");
    if (row.text("in_range").equals("0") || isTwoPhase(row, "phase2")) {
      assertThrows(OutsideValidity.class, () -> gas.atPressureEntropy(p2, start.entropy()));
      return;
    }
    State end = gas.atPressureEntropy(p2, start.entropy());
    assertRelative("T2", row.number("T2"), end.temperature(), TOLERANCE);
    assertRelative("rho2", row.number("rho2"), end.molarDensity(), TOLERANCE);
  }

  @ParameterizedTest
  @MethodSource("isochores")
  void developedPressureAgreesWithTheTable(Row row) {
    assertOnIsochore(row, "T1", "p1", isTwoPhase(row, "phase1"));
    assertOnIsochore(row, "T2", "p2", isTwoPhase(row, "phase2"));
  }

  private static void assertOnIsochore(Row row, String t, String p, boolean twoPhase) {
    Gas gas = gas(row);
    double rho = row.number("rho");
    double temperature = row.number(t);
    double pressure = row.number(p);
    if (twoPhase) {
      assertRefused(() -> gas.at(temperature, rho));
      assertRefused(() -> gas.atDensityPressure(rho, pressure));
      return;
    }
    assertRelative(p, pressure, gas.at(temperature, rho).pressure(), TOLERANCE);
    State found = gas.atDensityPressure(rho, pressure);
    assertRelative(t, temperature, found.temperature(), TOLERANCE);
  }

  @ParameterizedTest
  @MethodSource("charging")
  void adiabaticFillingOfTheTableClosesTheEnergyBalance(Row row) {
    Gas gas = gas(row);
    State start = gas.atTemperaturePressure(row.number("T1"), row.number("p1"));
    State supply = gas.atTemperaturePressure(row.number("T_supply"), row.number("p_supply"));
    assertRelative("rho1", row.number("rho1"), start.molarDensity(), TOLERANCE);
    assertEnergy("h_in", row.number("h_in"), supply.enthalpy(), row.number("T_supply"));
    // From the end density of the table, the balance gives the end energy and that the end state.
    double rho1 = start.molarDensity();
    double rho2 = row.number("rho2");
    double h = supply.enthalpy();
    double u2 = h + rho1 / rho2 * (start.internalEnergy() - h);
    State end = gas.atDensityEnergy(rho2, u2, start.temperature());
    assertRelative("T2", row.number("T2"), end.temperature(), TOLERANCE);
    assertRelative("p2", row.number("p2"), end.pressure(), TOLERANCE);
  }

  @ParameterizedTest
  @MethodSource("venting")
  void gasLeftAfterVentingAgreesWithTheTable(Row row) {
    Gas gas = gas(row);
    State start = gas.atTemperaturePressure(row.number("T1"), row.number("p1"));
    assertRelative("rho1", row.number("rho1"), start.molarDensity(), TOLERANCE);
    State end = gas.atPressureEntropy(row.number("p2"), start.entropy());
    assertRelative("T2", row.number("T2"), end.temperature(), TOLERANCE);
    assertRelative("rho2", row.number("rho2"), end.molarDensity(), TOLERANCE);
    double left = end.molarDensity() / start.molarDensity();
    assertRelative("fraction", row.number("fraction_left"), left, TOLERANCE);
    State again = gas.atDensityEntropy(end.molarDensity(), start.entropy());
    assertRelative("T2", row.number("T2"), again.temperature(), TOLERANCE);
  }
}
