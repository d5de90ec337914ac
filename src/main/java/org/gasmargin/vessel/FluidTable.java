package org.gasmargin.vessel;

import java.util.Arrays;
import java.util.Locale;
import org.gasmargin.gas.OutsideValidity;

/**
 * Properties of the fluid around a vessel at ordinary pressure, linear between the rows of a table.
 *
 * <p>Source: Incropera and others, Fundamentals of Heat and Mass Transfer, tables A.4 and A.6;
 * published, from memory, high confidence.
 */
final class FluidTable {
  /** Dry air: temperature K, viscosity Pa s, conductivity W/(m K), Prandtl number. */
  static final FluidTable AIR =
      new FluidTable(
          "air",
          new double[][] {
            {100, 71.1e-7, 9.34e-3, 0.786},
            {150, 103.4e-7, 13.8e-3, 0.758},
            {200, 132.5e-7, 18.1e-3, 0.737},
            {250, 159.6e-7, 22.3e-3, 0.720},
            {300, 184.6e-7, 26.3e-3, 0.707},
            {350, 208.2e-7, 30.0e-3, 0.700},
            {400, 230.1e-7, 33.8e-3, 0.690},
            {450, 250.7e-7, 37.3e-3, 0.686},
            {500, 270.1e-7, 40.7e-3, 0.684},
            {600, 305.8e-7, 46.9e-3, 0.685},
            {800, 369.8e-7, 57.3e-3, 0.709},
            {1000, 424.4e-7, 66.7e-3, 0.726},
          });

  /** Liquid water; the last column is the magnitude of the volume expansivity, 1/K. */
  static final FluidTable WATER =
      new FluidTable(
          "water",
          new double[][] {
            {273.15, 1750e-6, 0.569, 12.99, 68.05e-6},
            {275, 1652e-6, 0.574, 12.22, 32.74e-6},
            {280, 1422e-6, 0.582, 10.26, 46.04e-6},
            {285, 1225e-6, 0.590, 8.81, 114.1e-6},
            {290, 1080e-6, 0.598, 7.56, 174.0e-6},
            {295, 959e-6, 0.606, 6.62, 227.5e-6},
            {300, 855e-6, 0.613, 5.83, 276.1e-6},
            {310, 695e-6, 0.628, 4.62, 361.9e-6},
            {320, 577e-6, 0.640, 3.77, 436.7e-6},
            {330, 489e-6, 0.650, 3.15, 504.0e-6},
            {340, 420e-6, 0.660, 2.66, 566.0e-6},
            {350, 365e-6, 0.668, 2.29, 624.2e-6},
            {360, 324e-6, 0.674, 2.02, 697.9e-6},
            {373.15, 279e-6, 0.680, 1.76, 750.1e-6},
          });

  private static final double GAS_CONSTANT_OF_AIR = 287.05;
  private static final double DENSITY_OF_WATER = 990;

  private final String name;
  private final double lowest;
  private final double highest;
  private final PiecewiseLinear[] columns;

  private FluidTable(String name, double[][] rows) {
    this.name = name;
    this.lowest = rows[0][0];
    this.highest = rows[rows.length - 1][0];
    this.columns = new PiecewiseLinear[rows[0].length - 1];
    for (int c = 0; c < columns.length; c++) {
      int column = c + 1;
      columns[c] =
          new PiecewiseLinear(
              Arrays.stream(rows).mapToDouble(row -> row[0]).toArray(),
              Arrays.stream(rows).mapToDouble(row -> row[column]).toArray());
    }
  }

  /**
   * Refuses a temperature beyond the table.
   *
   * @throws OutsideValidity with the range
   */
  void check(double temperature) {
    if (!(temperature >= lowest && temperature <= highest)) {
      throw new OutsideValidity(
          String.format(
              Locale.ROOT,
              "%s outside the vessel at %.2f K is beyond its property table, %.2f K to %.2f K",
              name,
              temperature,
              lowest,
              highest));
    }
  }

  /**
   * Properties at a film temperature.
   *
   * @param temperature K
   * @param pressure Pa absolute, used for the density of air
   * @throws OutsideValidity beyond the ends of the table
   */
  Properties at(double temperature, double pressure) {
    check(temperature);
    boolean liquid = columns.length > 3;
    return new Properties(
        liquid ? DENSITY_OF_WATER : pressure / (GAS_CONSTANT_OF_AIR * temperature),
        columns[0].at(temperature),
        columns[1].at(temperature),
        columns[2].at(temperature),
        liquid ? columns[3].at(temperature) : 1 / temperature);
  }

  /**
   * Properties of a film.
   *
   * @param density kg/m3
   * @param viscosity Pa s
   * @param conductivity W/(m K)
   * @param prandtl Prandtl number
   * @param expansivity magnitude of the volume expansivity, 1/K
   */
  record Properties(
      double density, double viscosity, double conductivity, double prandtl, double expansivity) {

    /** Rayleigh number over a length, m, and a temperature difference, K. */
    double rayleigh(double length, double difference) {
      double kinematic = viscosity / density;
      return 9.80665
          * expansivity
          * difference
          * length
          * length
          * length
          * prandtl
          / (kinematic * kinematic);
    }
  }
}
