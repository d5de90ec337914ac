package org.gasmargin.process.modelled;

import static org.gasmargin.process.modelled.Jobs.STEEL;
import static org.gasmargin.process.modelled.Jobs.first;
import static org.gasmargin.process.modelled.Jobs.layer;
import static org.gasmargin.process.modelled.Jobs.path;
import static org.gasmargin.process.modelled.Jobs.plate;
import static org.gasmargin.process.modelled.Jobs.ramp;
import static org.gasmargin.process.modelled.Jobs.rampDown;
import static org.gasmargin.process.modelled.Jobs.supply;
import static org.gasmargin.process.modelled.Jobs.vessel;

import java.util.stream.Stream;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.gas.published.Nearness;
import org.gasmargin.gas.published.PublishedTable;
import org.gasmargin.gas.published.PublishedTable.Row;
import org.gasmargin.process.Path;
import org.gasmargin.vessel.Wall;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * A wall that takes no heat leaves the real-gas bounds of the tables {@code gas-charging} and
 * {@code gas-venting}, whose status is: computed by an independent implementation.
 */
class NoFilmTest {
  private static final GasCatalogue CATALOGUE = new GasCatalogue();
  private static final Wall TIGHT = plate(1, 0, 0, layer(STEEL, 0.006));

  static Stream<Row> charges() {
    return everyNth("gas-charging", 7).filter(row -> row.number("in_range") == 1);
  }

  static Stream<Row> vents() {
    return everyNth("gas-venting", 5)
        .filter(row -> row.number("p2") > 101325)
        .filter(row -> !row.text("phase2").equals("twophase"));
  }

  private static Stream<Row> everyNth(String table, int n) {
    int[] count = {0};
    return PublishedTable.rows(table)
        .filter(row -> CATALOGUE.find(row.text("gas")).isPresent())
        .filter(row -> count[0]++ % n == 0);
  }

  @ParameterizedTest
  @MethodSource("charges")
  void fillWithoutFilmIsTheAdiabaticCharge(Row row) {
    Gas gas = CATALOGUE.find(row.text("gas")).orElseThrow();
    Path path =
        path(
            first(
                vessel(gas, 0.05, row.number("p1"), row.number("T1"), TIGHT),
                row.number("T1"),
                ramp(
                    supply(row.number("p_supply"), row.number("T_supply")), row.number("p2"), 60)));
    Nearness.assertRelative("T2 " + row, row.number("T2"), path.last().temperature(), 1e-6);
    double ratio = path.last().mass() / path.first().mass();
    Nearness.assertRelative("mass ratio " + row, row.number("mass_ratio"), ratio, 1e-6);
  }

  @ParameterizedTest
  @MethodSource("vents")
  void ventWithoutFilmIsTheIsentropeOfTheGasLeft(Row row) {
    Gas gas = CATALOGUE.find(row.text("gas")).orElseThrow();
    Path path =
        path(
            first(
                vessel(gas, 0.05, row.number("p1"), row.number("T1"), TIGHT),
                row.number("T1"),
                rampDown(row.number("p2"), 60)));
    Nearness.assertRelative("T2 " + row, row.number("T2"), path.last().temperature(), 3e-6);
    double left = path.last().mass() / path.first().mass();
    Nearness.assertRelative("left " + row, row.number("fraction_left"), left, 3e-6);
  }
}
