package org.gasmargin.gas.transport;

import java.util.function.DoubleUnaryOperator;
import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;

/**
 * Thermal conductivity as dilute gas + density part + critical enhancement, each W/(m K).
 *
 * @param dilute of T, K
 * @param residual density part
 * @param critical enhancement near the critical point
 */
public record ConductivitySum(
    DoubleUnaryOperator dilute, ToDoubleFunction<State> residual, ToDoubleFunction<State> critical)
    implements Conductivity {
  @Override
  public double at(State state) {
    return dilute.applyAsDouble(state.temperature())
        + residual.applyAsDouble(state)
        + critical.applyAsDouble(state);
  }
}
