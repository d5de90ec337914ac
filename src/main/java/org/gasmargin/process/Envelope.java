package org.gasmargin.process;

import java.util.List;
import java.util.Optional;

/**
 * The extremes of a step over every start that the earlier steps allow and every exchange of heat
 * from none to perfect. An extreme is empty if any branch that could set it left its validity.
 *
 * @param highestGasTemperature K, mean gas
 * @param lowestGasTemperature K, mean gas
 * @param highestPressure Pa absolute
 * @param lowestPressure Pa absolute
 * @param highestUnmixedTemperature K, gas pushed ahead without mixing, fills and compressions only
 * @param highestSurroundings highest temperature that the wall or ambient can have in the step, K
 * @param lowestSurroundings lowest temperature that the wall or ambient can have in the step, K
 * @param failures why an extreme is unknown, in plain words
 */
public record Envelope(
    Optional<Extreme> highestGasTemperature,
    Optional<Extreme> lowestGasTemperature,
    Optional<Extreme> highestPressure,
    Optional<Extreme> lowestPressure,
    Optional<Extreme> highestUnmixedTemperature,
    double highestSurroundings,
    double lowestSurroundings,
    List<String> failures) {

  /** Copies the list. */
  public Envelope {
    failures = List.copyOf(failures);
  }
}
