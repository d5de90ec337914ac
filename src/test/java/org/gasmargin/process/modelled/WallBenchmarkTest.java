package org.gasmargin.process.modelled;

import static org.gasmargin.process.modelled.Jobs.at;
import static org.gasmargin.process.modelled.Jobs.flowIn;
import static org.gasmargin.process.modelled.Jobs.flowOut;
import static org.gasmargin.process.modelled.Jobs.hold;
import static org.gasmargin.process.modelled.Jobs.layer;
import static org.gasmargin.process.modelled.Jobs.material;
import static org.gasmargin.process.modelled.Jobs.path;
import static org.gasmargin.process.modelled.Jobs.plate;
import static org.gasmargin.process.modelled.Jobs.ramp;
import static org.gasmargin.process.modelled.Jobs.supply;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.gas.published.Nearness;
import org.gasmargin.gas.published.PublishedTable;
import org.gasmargin.gas.published.PublishedTable.Row;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Step;
import org.gasmargin.process.Supply;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Gas and wall together with everything prescribed, against the table {@code wall-benchmarks},
 * whose status is: computed by an independent implementation.
 */
class WallBenchmarkTest {
  private static final double TEMPERATURE_TOLERANCE = 0.01;
  private static final double PRESSURE_TOLERANCE = 1e-5;

  /**
   * One case.
   *
   * @param name as in the table
   * @param vessel vessel at its start
   * @param ambient K
   * @param steps the phases in order
   */
  record Case(String name, Vessel vessel, double ambient, List<Step> steps) {
    @Override
    public String toString() {
      return name;
    }
  }

  static Stream<Case> cases() {
    Wall steel6 = plate(1.2, 150, 8, layer(material(7850, 45, 470), 0.006));
    Wall composite =
        plate(
            2.0,
            250,
            8,
            layer(material(2700, 167, 896), 0.006),
            layer(material(1550, 0.7, 1000), 0.025));
    Wall steel22 = plate(10, 30, 6, layer(material(7850, 45, 470), 0.022));
    Wall aluminium = plate(0.36, 100, 12, layer(material(2700, 167, 896), 0.0118));
    Wall plastic =
        plate(
            0.9,
            200,
            8,
            layer(material(950, 0.4, 2250), 0.005),
            layer(material(1550, 0.7, 1000), 0.020));
    Wall steel8 = plate(1.5, 120, 10, layer(material(7850, 45, 470), 0.008));
    Supply air = supply(3e7, 293.15);
    return Stream.of(
        new Case(
            "N2-fill-steel",
            vessel("nitrogen", 0.05, 5e5, 293.15, steel6),
            293.15,
            List.of(ramp(supply(2.5e7, 293.15), 2e7, 180))),
        new Case(
            "H2-fill-aluminium-composite",
            vessel("hydrogen", 0.12, 2e6, 293.15, composite),
            293.15,
            List.of(ramp(supply(4.5e7, 303.15), 3.5e7, 240))),
        new Case(
            "N2-vent-thick-steel",
            vessel("nitrogen", 2.0, 4.1e6, 288.15, steel22),
            288.15,
            List.of(flowOut(0.28, 300))),
        new Case(
            "air-fill-hold-aluminium",
            vessel("air", 0.0111, 5e6, 293.15, aluminium),
            293.15,
            List.of(flowIn(air, 0.0114, 180), hold(600))),
        new Case(
            "He-fill-plastic-composite",
            vessel("helium", 0.05, 2e5, 293.15, plastic),
            293.15,
            List.of(ramp(supply(2e7, 293.15), 1e7, 60), hold(120))),
        new Case(
            "CH4-fill-vent-steel",
            vessel("methane", 0.08, 2e6, 308.15, steel8),
            308.15,
            List.of(ramp(supply(2.5e7, 308.15), 2e7, 360), hold(300), flowOut(0.06, 120))));
  }

  private static Vessel vessel(
      String gas, double volume, double pressure, double temperature, Wall wall) {
    return Jobs.vessel(gas(gas), volume, pressure, temperature, wall);
  }

  private static Gas gas(String name) {
    return new GasCatalogue().find(name).orElseThrow();
  }

  @ParameterizedTest
  @MethodSource("cases")
  void pathMeetsTheTableAtEveryTime(Case benchmark) {
    List<Row> rows =
        PublishedTable.rows("wall-benchmarks")
            .filter(row -> row.text("case").equals(benchmark.name()))
            .toList();
    ModelledVessel model = Jobs.model(benchmark.vessel(), benchmark.ambient());
    VesselCondition condition = model.start();
    double start = 0;
    int compared = 0;
    for (Step step : benchmark.steps()) {
      ModelledStep result = model.run(step, condition);
      Path path = path(result);
      double from = start;
      double end = start + path.duration();
      List<Row> phase =
          rows.stream()
              .filter(row -> row.number("t_s") > from || (from == 0 && row.number("t_s") == 0))
              .filter(row -> row.number("t_s") <= end)
              .toList();
      for (Row row : phase) {
        compare(row, at(path, row.number("t_s") - start));
        compared++;
      }
      assertTrue(result.closure().orElseThrow().holds(), () -> "" + result.closure());
      condition = result.end().orElseThrow();
      start = end;
    }
    assertEquals(rows.size(), compared);
  }

  private static void compare(Row row, PathPoint point) {
    Nearness.assertRelative(
        "pressure of " + row, row.number("p_Pa"), point.pressure(), PRESSURE_TOLERANCE);
    double massTolerance = PRESSURE_TOLERANCE + TEMPERATURE_TOLERANCE / row.number("T_gas_K");
    Nearness.assertRelative("mass of " + row, row.number("m_kg"), point.mass(), massTolerance);
    assertNear("gas", row, "T_gas_K", point.temperature());
    assertNear("inner surface", row, "T_wall_inner_K", point.innerWall().orElseThrow());
    assertNear("mean wall", row, "T_wall_mean_K", point.meanWall().orElseThrow());
  }

  private static void assertNear(String what, Row row, String column, double actual) {
    assertEquals(row.number(column), actual, TEMPERATURE_TOLERANCE, () -> what + " of " + row);
  }
}
