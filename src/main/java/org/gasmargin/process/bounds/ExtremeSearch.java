package org.gasmargin.process.bounds;

import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Stretch;
import org.jspecify.annotations.Nullable;

/** Keeps the furthest value of one property of the gas, and the words of the path to it. */
final class ExtremeSearch {
  private final ToDoubleFunction<State> property;
  private final boolean highest;
  private @Nullable Extreme best;
  private boolean known = true;

  ExtremeSearch(ToDoubleFunction<State> property, boolean highest) {
    this.property = property;
    this.highest = highest;
  }

  /**
   * Takes a state into account; of equal states the one named first is kept.
   *
   * @param from where the stretch without heat, or at constant volume, begins that led there
   */
  void consider(State state, String words, Optional<State> from) {
    double value = property.applyAsDouble(state);
    if (best == null || (highest ? value > best.value() : value < best.value())) {
      String path = words.isEmpty() ? "at the start of the step" : words;
      best = new Extreme(value, path, from.map(start -> stretch(start, state)));
    }
  }

  private static Stretch stretch(State start, State end) {
    return new Stretch(
        start.pressure(),
        start.temperature(),
        end.pressure(),
        end.temperature(),
        start.molarDensity() == end.molarDensity());
  }

  /** Something that could set the extreme is unknown, so the extreme is. */
  void lose() {
    known = false;
  }

  /** The extreme, if everything that could set it was followed to its end. */
  Optional<Extreme> result() {
    return known ? Optional.ofNullable(best) : Optional.empty();
  }
}
