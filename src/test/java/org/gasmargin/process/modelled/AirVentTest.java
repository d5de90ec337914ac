package org.gasmargin.process.modelled;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.gas.published.PublishedTable;
import org.gasmargin.gas.published.PublishedTable.Row;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;
import org.junit.jupiter.api.Test;

/**
 * A logged vent of air, table {@code air-vent-3p18mm}. Status: published, raw measured log.
 *
 * <p>The log does not state the discharge coefficient, the true gas temperature at the start, the
 * delay of the valve and the lag of the sensor; these four are searched for within fixed ranges.
 * Shape, wall and ambient temperature are assumed. The heat transfer is the default and is not
 * touched.
 */
class AirVentTest {
  private static final double ATMOSPHERE = 101645;
  private static final double AMBIENT = 299;
  private static final double START_PRESSURE = 342650 + ATMOSPHERE;
  private static final double SENSOR_START = 327.5;
  private static final List<Row> LOG = PublishedTable.rows("air-vent-3p18mm").toList();
  private static final Gas AIR = new GasCatalogue().find("air").orElseThrow();

  /** A lying steel receiver of 0.125 m3 whose length is 2.75 diameters. */
  private static final Wall RECEIVER =
      new Wall(
          new WallShape.Cylinder(0.387, 1.064, true),
          List.of(Jobs.layer(Jobs.material(7850, 54, 465), 0.004)),
          new InsideFilm.Correlation(),
          new OutsideFilm.StillAir());

  /**
   * A comparison with the log.
   *
   * @param path modelled path
   * @param pressure largest deviation from 17 s on, kPa
   * @param temperature largest deviation of the lagged temperature after 20 s, K
   * @param words what was fitted and every deviation
   */
  private record Fit(Path path, double pressure, double temperature, String words) {
    double misfit() {
      return Math.max(pressure / 6, temperature / 3);
    }
  }

  private static Path vent(double discharge, double startTemperature) {
    Vessel tank = Jobs.vessel(AIR, 0.125, START_PRESSURE, startTemperature, AMBIENT, RECEIVER);
    Site site = new Site(Interval.exactly(AMBIENT), Interval.exactly(ATMOSPHERE));
    ModelledVessel model = new ModelledVessel(tank, site, ModelInputs.NOMINAL);
    Drive nozzle =
        new Drive.Orifice(
            Interval.exactly(0.003175),
            Interval.exactly(discharge),
            Optional.empty(),
            OptionalDouble.of(143));
    return Jobs.path(model.run(new Step.Vent("1", "tank", nozzle), model.start()));
  }

  /** A point of the path between its samples; the start before the valve opens. */
  private static PathPoint at(Path path, double time) {
    List<PathPoint> points = path.points();
    int i = 1;
    while (i + 1 < points.size() && points.get(i).time() < time) {
      i++;
    }
    PathPoint a = points.get(i - 1);
    PathPoint b = points.get(i);
    double share = Math.max(0, (time - a.time()) / (b.time() - a.time()));
    return new PathPoint(
        time,
        a.pressure() + share * (b.pressure() - a.pressure()),
        a.temperature() + share * (b.temperature() - a.temperature()),
        a.mass(),
        a.massFlow(),
        OptionalDouble.empty(),
        OptionalDouble.empty());
  }

  private static Fit compare(Path path, String fitted, double delay, double lag) {
    StringBuilder words = new StringBuilder(fitted);
    words.append(String.format(Locale.ROOT, ", delay %.1f s, lag %.0f s:", delay, lag));
    double pressure = 0;
    double temperature = 0;
    double sensor = SENSOR_START;
    double time = 0;
    double step = 0.1;
    for (Row row : LOG) {
      for (; time < row.number("t_s") - step / 2; time += step) {
        double gas = at(path, time + step / 2 - delay).temperature();
        sensor += (gas - sensor) * (1 - Math.exp(-step / lag));
      }
      double gauge = (at(path, row.number("t_s") - delay).pressure() - ATMOSPHERE) / 1e3;
      double byPressure = gauge - row.number("p_gauge_kPa");
      double byTemperature = sensor - 273.15 - row.number("T_sensor_C");
      if (row.number("t_s") >= 17) {
        pressure = Math.max(pressure, Math.abs(byPressure));
        words.append(
            String.format(
                Locale.ROOT,
                " %.0f s %.1f kPa %.1f K,",
                row.number("t_s"),
                byPressure,
                byTemperature));
      }
      if (row.number("t_s") > 20) {
        temperature = Math.max(temperature, Math.abs(byTemperature));
      }
    }
    return new Fit(path, pressure, temperature, words.toString());
  }

  private static Fit bestFit() {
    Fit best = new Fit(vent(0.85, 314), Double.MAX_VALUE, Double.MAX_VALUE, "none");
    for (double discharge : new double[] {0.88, 0.92, 0.96, 1}) {
      for (double start : new double[] {308, 312, 316, 320}) {
        Path path = vent(discharge, start);
        String fitted =
            String.format(Locale.ROOT, "coefficient %.2f, start %.0f K", discharge, start);
        for (double delay : new double[] {0, 1, 2, 3}) {
          for (double lag : new double[] {30, 35, 40}) {
            Fit fit = compare(path, fitted, delay, lag);
            best = fit.misfit() < best.misfit() ? fit : best;
          }
        }
      }
    }
    return best;
  }

  @Test
  void loggedVentIsMetWithTheDefaultHeatTransfer() {
    Fit best = bestFit();
    assertTrue(best.pressure() <= 6, best::words);
    assertTrue(best.temperature() <= 3, best::words);
    assertEquals(278, best.path().lowestGasTemperature(), 6, best::words);
    // the gas starts warmer than the wall, so the bound is the isentrope of gas settled to the wall
    double entropy = AIR.atTemperaturePressure(AMBIENT, START_PRESSURE).entropy();
    for (PathPoint point : best.path().points()) {
      double bound = AIR.atPressureEntropy(point.pressure(), entropy).temperature();
      assertTrue(point.temperature() >= bound * (1 - 1e-6), () -> point + " below " + bound);
    }
  }

  /** The log itself shows that heat from the wall cannot be left out. */
  @Test
  void gasWithoutHeatFromTheWallWouldEndFarColderThanWasLogged() {
    double entropy = AIR.atTemperaturePressure(314, START_PRESSURE).entropy();
    double end = AIR.atPressureEntropy(ATMOSPHERE, entropy).temperature();
    assertEquals(205, end, 3);
    assertTrue(vent(0.93, 314).last().temperature() > 270);
  }
}
