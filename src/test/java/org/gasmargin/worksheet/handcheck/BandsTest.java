package org.gasmargin.worksheet.handcheck;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.gas.published.PublishedTable;
import org.gasmargin.gas.published.PublishedTable.Row;
import org.junit.jupiter.api.Test;

/**
 * Source of the cases: tables of adiabatic charging, venting, isentropic compression and developed
 * pressure. Status: computed by an independent implementation of published equations of state.
 */
class BandsTest {
  @Test
  void tableIsWhatItsGridGives() throws IOException {
    List<String> gases = List.of("nitrogen", "helium");
    List<String> table = bandLines();
    List<String> expected = BandTable.lines(gases);
    assertEquals(expected.subList(0, 5), table.subList(0, 5));
    List<String> rows =
        table.stream()
            .filter(row -> gases.stream().anyMatch(gas -> row.contains("," + gas + ",")))
            .toList();
    assertEquals(expected.subList(5, expected.size()), rows);
  }

  @Test
  void everyPublishedChargeLiesInItsBand() {
    List<String> outside = new ArrayList<>();
    int held = 0;
    for (Row row : rows("gas-charging")) {
      Gas gas = gas(row);
      double t1 = row.number("T1");
      double supply = row.number("T_supply");
      double ratio = row.number("p2") / row.number("p1");
      double ideal = RigidVessel.chargedTemperature(gamma(gas, t1), supply, t1, 1 / ratio);
      Bands.Key key =
          new Bands.Key(
              "charge",
              gas.id(),
              row.number("p_supply"),
              ratio,
              supply,
              row.number("p2") / row.number("p_supply"));
      held += hold(key, row.number("T2") / ideal, row, outside);
    }
    assertEquals(List.of(), outside);
    assertTrue(held > 180, "held " + held);
  }

  @Test
  void everyPublishedVentLiesInItsBand() {
    List<String> outside = new ArrayList<>();
    int held = 0;
    for (Row row : rows("gas-venting")) {
      if (row.text("phase2").equals("twophase")) {
        continue;
      }
      double p1 = row.number("p1");
      double ratio = p1 / row.number("p2");
      Bands.Key key = new Bands.Key("vent", gas(row).id(), p1, ratio, row.number("T1"), 1);
      held += hold(key, realOverIsentrope(row), row, outside);
    }
    assertEquals(List.of(), outside);
    assertTrue(held > 80, "held " + held);
  }

  @Test
  void everyPublishedCompressionLiesInItsBand() {
    List<String> outside = new ArrayList<>();
    int held = 0;
    for (Row row : rows("gas-isentropes")) {
      if (row.text("kind").equals("compression") && row.text("in_range").equals("1")) {
        double p2 = row.number("p2");
        Bands.Key key =
            new Bands.Key(
                "compression", gas(row).id(), p2, p2 / row.number("p1"), row.number("T1"), 1);
        held += hold(key, realOverIsentrope(row), row, outside);
      }
    }
    assertEquals(List.of(), outside);
    assertTrue(held > 80, "held " + held);
  }

  @Test
  void everyPublishedDevelopedPressureLiesInItsBand() {
    List<String> outside = new ArrayList<>();
    int held = 0;
    for (Row row : rows("gas-isochores")) {
      double t1 = row.number("T1");
      double warming = row.number("T2") / t1;
      double p1 = row.number("p1");
      Bands.Key key = new Bands.Key("isochore", gas(row).id(), p1, warming, t1, 1);
      held += hold(key, row.number("p2") / p1 / warming, row, outside);
    }
    assertEquals(List.of(), outside);
    assertTrue(held > 60, "held " + held);
  }

  @Test
  void caseOutsideTheTableHasNoBand() {
    assertEquals(
        Optional.empty(), Bands.find(new Bands.Key("charge", "air", 2e8, 10, 293.15, 0.8)));
    assertEquals(
        Optional.empty(), Bands.find(new Bands.Key("charge", "xenon", 2e7, 10, 293.15, 0.8)));
    assertEquals(
        Optional.empty(), Bands.find(new Bands.Key("vent", "air", Double.NaN, 10, 293.15, 1)));
  }

  private static int hold(Bands.Key key, double value, Row row, List<String> outside) {
    Optional<Bands.Band> band = Bands.find(key);
    if (band.isEmpty()) {
      return 0;
    }
    if (!(value >= band.get().lower() && value <= band.get().upper())) {
      outside.add(value + " " + band.get() + " " + row);
    }
    return 1;
  }

  private static double realOverIsentrope(Row row) {
    double t1 = row.number("T1");
    double ratio = row.number("p2") / row.number("p1");
    return row.number("T2") / IdealChange.temperature(t1, ratio, gamma(gas(row), t1));
  }

  private static double gamma(Gas gas, double temperature) {
    return HeatCapacityRatio.of(gas, temperature).value().value();
  }

  private static Gas gas(Row row) {
    return new GasCatalogue().find(row.text("gas")).orElseThrow();
  }

  /** The rows of the gases that the table of bands knows. */
  private static List<Row> rows(String name) {
    return PublishedTable.rows(name)
        .filter(row -> BandTable.GASES.contains(row.text("gas")))
        .toList();
  }

  private static List<String> bandLines() throws IOException {
    try (InputStream in = BandsTest.class.getResourceAsStream(Bands.RESOURCE)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8).lines().toList();
    }
  }
}
