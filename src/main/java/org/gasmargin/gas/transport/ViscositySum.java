package org.gasmargin.gas.transport;

import java.util.function.DoubleUnaryOperator;
import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;

/**
 * Viscosity eta0(T) (1 + B(T) rho) + etaR.
 *
 * @param dilute eta0, Pa s, of T, K
 * @param initial B, m3/mol, of T, K; zero where the correlation has none
 * @param higher etaR, Pa s
 */
public record ViscositySum(
    DoubleUnaryOperator dilute, DoubleUnaryOperator initial, ToDoubleFunction<State> higher)
    implements Viscosity {
  @Override
  public double at(State state) {
    double temperature = state.temperature();
    double virial = initial.applyAsDouble(temperature) * state.molarDensity();
    return dilute.applyAsDouble(temperature) * (1 + virial) + higher.applyAsDouble(state);
  }
}
