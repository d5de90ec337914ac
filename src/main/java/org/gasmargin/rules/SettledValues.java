package org.gasmargin.rules;

import static org.gasmargin.rules.ResultQuantity.DEVELOPED_PRESSURE_65;
import static org.gasmargin.rules.ResultQuantity.HIGHEST_SETTLED_PRESSURE_15;
import static org.gasmargin.rules.ResultQuantity.LOWEST_SETTLED_PRESSURE_15;

import java.util.Objects;
import java.util.Optional;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.process.StepResult;
import org.gasmargin.process.StepResult.DensityRange;

/**
 * What the gas in the closed vessel comes to at a reference temperature: density held, real gas.
 */
final class SettledValues {
  /** 15 degC, K. */
  private static final double SETTLED = 288.15;

  /** 65 degC, K. */
  private static final double DEVELOPED = 338.15;

  private final Gas gas;
  private final StepValues values;

  private SettledValues(Gas gas, StepValues values) {
    this.gas = gas;
    this.values = values;
  }

  /** Adds the settled and developed pressures of the most and least gas. */
  static void add(StepResult result, Gas gas, StepValues values) {
    SettledValues reader = new SettledValues(gas, values);
    Optional<Double> most = result.settledAmount().map(DensityRange::most);
    Optional<Double> least = result.settledAmount().map(DensityRange::least);
    reader.add(HIGHEST_SETTLED_PRESSURE_15, most, SETTLED, "most gas, settled to 15 degC");
    reader.add(LOWEST_SETTLED_PRESSURE_15, least, SETTLED, "least gas, settled to 15 degC");
    reader.add(DEVELOPED_PRESSURE_65, most, DEVELOPED, "most gas, warmed to 65 degC");
  }

  private void add(
      ResultQuantity quantity, Optional<Double> molarDensity, double temperature, String path) {
    if (molarDensity.isEmpty()) {
      values.unknown(quantity, "the amount of gas in the vessel is not known");
      return;
    }
    try {
      values.put(quantity, gas.at(temperature, molarDensity.get()).pressure(), path);
    } catch (OutsideValidity e) {
      values.unknown(quantity, Objects.requireNonNullElse(e.getMessage(), "outside validity"));
    }
  }
}
