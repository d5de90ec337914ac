package org.gasmargin.gas.published;

import static org.gasmargin.gas.published.Nearness.assertRelative;

import java.util.stream.Stream;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.gas.published.PublishedTable.Row;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Water against the test values that the releases of IAPWS print for programs; source and status in
 * the head of each table.
 */
class WaterTest {
  /** Half a unit in the ninth digit. */
  private static final double NINE_DIGITS = 5e-9;

  /** Half a unit in the eighth digit of a value that begins with a small one. */
  private static final double EIGHT_DIGITS = 3e-8;

  private static final Gas WATER = new GasCatalogue().find("water").orElseThrow();

  static Stream<Row> states() {
    return PublishedTable.rows("water-states");
  }

  static Stream<Row> saturation() {
    return PublishedTable.rows("water-saturation");
  }

  static Stream<Row> transport() {
    return PublishedTable.rows("water-transport");
  }

  private static State state(Row row) {
    return WATER.at(row.number("T"), row.number("rho") / WATER.molarMass());
  }

  @ParameterizedTest
  @MethodSource("states")
  void stateAgreesWithTheRelease(Row row) {
    State state = state(row);
    double kilo = 1000 * WATER.molarMass();
    assertRelative("p", row.number("p"), state.pressure() / 1e6, NINE_DIGITS);
    assertRelative("cv", row.number("cv"), state.cv() / kilo, NINE_DIGITS);
    assertRelative("w", row.number("w"), state.speedOfSound(), NINE_DIGITS);
    assertRelative("s", row.number("s"), state.entropy() / kilo, NINE_DIGITS);
  }

  @ParameterizedTest
  @MethodSource("saturation")
  void saturationAgreesWithTheRelease(Row row) {
    double t = row.number("T");
    double p = row.number("p") * 1e6;
    State vapour = WATER.atTemperaturePressure(t, p * (1 - 2 * NINE_DIGITS));
    State liquid = WATER.atTemperaturePressure(t, p * (1 + 2 * NINE_DIGITS));
    // The hair on the pressure moves the densities by less than four times as much.
    double tolerance = 10 * NINE_DIGITS;
    double m = WATER.molarMass();
    assertRelative("rhoV", row.number("rhoV"), vapour.molarDensity() * m, tolerance);
    assertRelative("rhoL", row.number("rhoL"), liquid.molarDensity() * m, tolerance);
  }

  @ParameterizedTest
  @MethodSource("transport")
  void transportAroundTheCriticalPointAgreesWithTheReleases(Row row) {
    State state = state(row);
    assertRelative(
        "viscosity", row.number("viscosity"), WATER.viscosity(state) * 1e6, EIGHT_DIGITS);
    assertRelative(
        "conductivity",
        row.number("conductivity"),
        WATER.thermalConductivity(state) * 1e3,
        EIGHT_DIGITS);
  }
}
