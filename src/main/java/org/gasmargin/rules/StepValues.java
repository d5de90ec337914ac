package org.gasmargin.rules;

import static org.gasmargin.rules.ResultQuantity.DURATION;
import static org.gasmargin.rules.ResultQuantity.LOWEST_PRESSURE;
import static org.gasmargin.rules.ResultQuantity.MEAN_PRESSURE_RATE;
import static org.gasmargin.rules.ResultQuantity.PEAK_PRESSURE;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;

/** The computed quantities of a step while they are collected. */
final class StepValues {
  private final Map<ResultQuantity, Operand> values = new EnumMap<>(ResultQuantity.class);

  /** Adds a number, or the fact that it is not finite. */
  void put(ResultQuantity quantity, double si, String path) {
    values.put(
        quantity, Operand.number(new Measure(quantity.dimension(), si), path, quantity.key()));
  }

  /** Adds what is known already. */
  void put(ResultQuantity quantity, Operand operand) {
    values.put(quantity, operand);
  }

  /** Adds the reason why a quantity is not known. */
  void unknown(ResultQuantity quantity, String reason) {
    values.put(quantity, new Operand.Unknown(quantity.key() + " is not known: " + reason));
  }

  /** Adds the mean rate of pressure change: the whole span of pressure in the duration. */
  void putPressureRate() {
    if (get(PEAK_PRESSURE) instanceof Operand.Figure highest
        && get(LOWEST_PRESSURE) instanceof Operand.Figure lowest
        && get(DURATION) instanceof Operand.Figure duration) {
      put(
          MEAN_PRESSURE_RATE,
          (highest.si() - lowest.si()) / duration.si(),
          "from the lowest to the highest pressure in the shortest time");
    } else {
      unknown(
          MEAN_PRESSURE_RATE, "it follows from pressures and a duration that are not all known");
    }
  }

  /** What is known of a quantity. */
  Operand get(ResultQuantity quantity) {
    return Optional.ofNullable(values.get(quantity))
        .orElseGet(() -> new Operand.Unknown(quantity.key() + " is not known"));
  }

  /** All that was added, by name. */
  void copyTo(Map<String, Operand> target) {
    values.forEach((quantity, operand) -> target.put(quantity.key(), operand));
  }
}
