package org.gasmargin.worksheet.handcheck;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.BiFunction;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;

/**
 * Works out the table of bands: real over ideal value over a grid of cases in each range of
 * pressure, ratio and temperature, from the published equations of state alone, without anything of
 * the simulation. Run {@link #main} with the path of the table to write it anew.
 */
final class BandTable {
  static final List<String> GASES =
      List.of("nitrogen", "oxygen", "argon", "air", "helium", "hydrogen", "methane");

  private static final double[] PRESSURES = {1, 50, 100, 200, 300, 500, 1000};
  private static final double[] RATIOS = {1.02, 2, 5, 20, 1100};
  private static final double[] CHARGE_RATIOS = {1.02, 3, 10, 1100};
  private static final double[] END_PARTS = {0.1, 0.3, 0.6, 1};
  private static final double[] SUPPLY_OVER_END = {1, 1.7, 3};
  private static final double[] ANY_PART = {0, 1};
  private static final double[] SUPPLY_TEMPERATURES = {233.15, 273.15, 303.15, 343.15};
  private static final double[] VENT_TEMPERATURES = {233.15, 293.15, 353.15, 473.15, 573.15};
  private static final double[] TRAPPED_TEMPERATURES = {233.15, 343.15};
  private static final double[] WARMING = {0.5, 0.65, 0.8, 0.98, 1.02, 1.2, 1.6};
  private static final double[] SETTLING_TEMPERATURES = {233.15, 293.15, 353.15, 473.15, 573.15};
  private static final double[] START_TEMPERATURES = {233.15, 288.15, 343.15};
  private static final int COARSE = 3;
  private static final int FINE = 7;
  private static final int FEWEST_CASES = 20;
  private static final double ALLOWANCE = 0.002;

  private final List<String> lines = new ArrayList<>();

  private BandTable() {}

  /** Writes the table to the file named by the only argument. */
  public static void main(String[] arguments) throws IOException {
    Files.writeString(Path.of(arguments[0]), String.join("\n", lines(GASES)) + "\n");
  }

  static List<String> lines(List<String> gases) {
    BandTable table = new BandTable();
    table.lines.add(
        "# Real-gas over ideal-gas value: end temperature, or end pressure of isochores.");
    table.lines.add("# Least and most over a grid in each range, widened by " + ALLOWANCE + ".");
    table.lines.add("# Source: the published equations of state named in the gas data files.");
    table.lines.add("# Pressures in bar(a), temperatures in K; their meaning: see class Bands.");
    table.lines.add(
        "process,gas,pressure_from,pressure_to,ratio_from,ratio_to,temperature_from,"
            + "temperature_to,part_from,part_to,lower,upper,cases");
    for (String id : gases) {
      Gas gas = new GasCatalogue().find(id).orElseThrow();
      for (int part = 1; part < END_PARTS.length; part++) {
        double[] parts = {END_PARTS[part - 1], END_PARTS[part]};
        table.ranges(gas, "charge", CHARGE_RATIOS, SUPPLY_TEMPERATURES, parts, BandTable::charges);
      }
      table.ranges(
          gas, "mass_charge", CHARGE_RATIOS, SUPPLY_TEMPERATURES, ANY_PART, BandTable::massCharges);
      table.ranges(gas, "vent", RATIOS, VENT_TEMPERATURES, ANY_PART, BandTable::vents);
      table.ranges(
          gas, "compression", RATIOS, TRAPPED_TEMPERATURES, ANY_PART, BandTable::compressions);
      table.ranges(gas, "isochore", WARMING, SETTLING_TEMPERATURES, ANY_PART, BandTable::isochores);
    }
    return table.lines;
  }

  /**
   * A case of the grid.
   *
   * @param pressure Pa
   * @param temperature K
   * @param fromPart least end pressure over the pressure of the supply
   * @param toPart most of it
   */
  private record Case(
      double pressure, double ratio, double temperature, double fromPart, double toPart) {}

  private void ranges(
      Gas gas,
      String process,
      double[] ratios,
      double[] temperatures,
      double[] parts,
      BiFunction<Gas, Case, List<Double>> realOverIdeal) {
    for (int p = 1; p < PRESSURES.length; p++) {
      for (int r = 1; r < ratios.length; r++) {
        for (int t = 1; t < temperatures.length; t++) {
          List<Double> values = new ArrayList<>();
          int points = process.endsWith("charge") ? COARSE : FINE;
          for (double pressure : between(PRESSURES[p - 1], PRESSURES[p], points)) {
            for (double ratio : between(ratios[r - 1], ratios[r], points)) {
              for (double temperature : between(temperatures[t - 1], temperatures[t], points)) {
                values.addAll(
                    realOverIdeal.apply(
                        gas, new Case(pressure * 1e5, ratio, temperature, parts[0], parts[1])));
              }
            }
          }
          String range =
              String.format(
                  Locale.ROOT,
                  "%s,%s,%.0f,%.0f,%s,%s,%.2f,%.2f,%s,%s",
                  process,
                  gas.id(),
                  PRESSURES[p - 1],
                  PRESSURES[p],
                  ratios[r - 1],
                  ratios[r],
                  temperatures[t - 1],
                  temperatures[t],
                  parts[0],
                  parts[1]);
          keep(range, values);
        }
      }
    }
  }

  private void keep(String range, List<Double> values) {
    if (values.size() >= FEWEST_CASES) {
      double least = values.stream().mapToDouble(v -> v).min().orElseThrow() - ALLOWANCE;
      double most = values.stream().mapToDouble(v -> v).max().orElseThrow() + ALLOWANCE;
      lines.add(
          String.format(
              Locale.ROOT,
              "%s,%.3f,%.3f,%d",
              range,
              Math.floor(least * 1000) / 1000,
              Math.ceil(most * 1000) / 1000,
              values.size()));
    }
  }

  /** Points in equal ratios from one end of a range to the other. */
  private static double[] between(double from, double to, int points) {
    double[] values = new double[points];
    for (int i = 0; i < points; i++) {
      values[i] = i == points - 1 ? to : from * Math.pow(to / from, (double) i / (points - 1));
    }
    return values;
  }

  private static double gamma(Gas gas, double temperature) {
    return HeatCapacityRatio.of(gas, temperature).value().value();
  }

  private static List<Double> charges(Gas gas, Case one) {
    List<Double> values = new ArrayList<>();
    for (double start : START_TEMPERATURES) {
      for (double part : between(one.fromPart(), one.toPart(), COARSE)) {
        values.addAll(charge(gas, one, start, one.pressure() * part));
      }
    }
    return values;
  }

  private static List<Double> charge(Gas gas, Case one, double start, double p2) {
    try {
      double enthalpy = gas.atTemperaturePressure(one.temperature(), one.pressure()).enthalpy();
      State first = gas.atTemperaturePressure(start, p2 / one.ratio());
      double ideal =
          RigidVessel.chargedTemperature(
              gamma(gas, start), one.temperature(), start, 1 / one.ratio());
      return List.of(charged(gas, first, enthalpy, p2) / ideal);
    } catch (OutsideValidity beyond) {
      return List.of();
    }
  }

  /** End temperature of an adiabatic charge: rho (u - h0) stays, by the secant method in T. */
  private static double charged(Gas gas, State first, double enthalpy, double p2) {
    double kept = first.molarDensity() * (first.internalEnergy() - enthalpy);
    double before = first.temperature();
    double now = first.temperature() * 1.2;
    double valueBefore = excess(gas, before, p2, enthalpy) - kept;
    for (int i = 0; i < 60; i++) {
      double value = excess(gas, now, p2, enthalpy) - kept;
      double next = now - value * (now - before) / (value - valueBefore);
      before = now;
      valueBefore = value;
      now = Math.max(0.6 * before, Math.min(1.6 * before, next));
      if (Math.abs(now - before) < 1e-9 * now) {
        return now;
      }
    }
    throw new OutsideValidity("the charge did not converge");
  }

  private static double excess(Gas gas, double temperature, double pressure, double enthalpy) {
    State state = gas.atTemperaturePressure(temperature, pressure);
    return state.molarDensity() * (state.internalEnergy() - enthalpy);
  }

  /** The pressure of the case is the ideal end pressure, its ratio that of the ideal masses. */
  private static List<Double> massCharges(Gas gas, Case one) {
    List<Double> values = new ArrayList<>();
    for (double start : START_TEMPERATURES) {
      for (double excess : SUPPLY_OVER_END) {
        values.addAll(massCharge(gas, one, start, one.pressure() * excess));
      }
    }
    return values;
  }

  private static List<Double> massCharge(Gas gas, Case one, double start, double supply) {
    double ideal =
        RigidVessel.chargedTemperatureByMass(
            gamma(gas, start), one.temperature(), start, one.ratio());
    double p1 = one.pressure() * start / ideal / one.ratio();
    double idealDensity = p1 / (Gas.MOLAR_GAS_CONSTANT * start);
    try {
      double enthalpy = gas.atTemperaturePressure(one.temperature(), supply).enthalpy();
      State first = gas.atTemperaturePressure(start, p1);
      double density = first.molarDensity() + (one.ratio() - 1) * idealDensity;
      double energy =
          enthalpy + first.molarDensity() * (first.internalEnergy() - enthalpy) / density;
      double real = gas.atDensityEnergy(density, energy, ideal).pressure();
      return List.of(real / one.pressure());
    } catch (OutsideValidity beyond) {
      return List.of();
    }
  }

  private static List<Double> vents(Gas gas, Case one) {
    return isentropes(gas, one.temperature(), one.pressure(), one.pressure() / one.ratio());
  }

  private static List<Double> compressions(Gas gas, Case one) {
    return isentropes(gas, one.temperature(), one.pressure() / one.ratio(), one.pressure());
  }

  private static List<Double> isentropes(Gas gas, double t1, double p1, double p2) {
    try {
      State first = gas.atTemperaturePressure(t1, p1);
      double real = gas.atPressureEntropy(p2, first.entropy()).temperature();
      return List.of(real / IdealChange.temperature(t1, p2 / p1, gamma(gas, t1)));
    } catch (OutsideValidity beyond) {
      return List.of();
    }
  }

  private static List<Double> isochores(Gas gas, Case one) {
    try {
      State first = gas.atTemperaturePressure(one.temperature(), one.pressure());
      State second = gas.at(one.temperature() * one.ratio(), first.molarDensity());
      return List.of(second.pressure() / first.pressure() / one.ratio());
    } catch (OutsideValidity beyond) {
      return List.of();
    }
  }
}
