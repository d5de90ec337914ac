package org.gasmargin.gas.transport;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.gasmargin.gas.equation.HelmholtzEquation;

/**
 * Conductivity of dilute ethane, W/(m K), after Friend, Ingham and Ely: C (1e6 eta0) (3.75 + (f0 +
 * f1/T*) (c - 1.5)) with c the heat capacity of internal motion and translation over R, taken from
 * the equation of state.
 */
public final class EthaneFriendDilute implements DoubleUnaryOperator {
  private final double factor;
  private final double epsilonOverK;
  private final List<Double> internal;
  private final double heatScale;
  private final DoubleUnaryOperator diluteViscosity;
  private final HelmholtzEquation equation;

  /**
   * @param factor C
   * @param epsilonOverK depth of the molecule's potential, K
   * @param reducingTemperature Tr of the correlation, K; the paper multiplies a derivative of the
   *     equation of state by its own Tr/T, which differs in the fifth digit
   * @param internal f0, f1
   * @param diluteViscosity eta0, Pa s
   * @param equation equation of state
   */
  public EthaneFriendDilute(
      double factor,
      double epsilonOverK,
      double reducingTemperature,
      List<Double> internal,
      DoubleUnaryOperator diluteViscosity,
      HelmholtzEquation equation) {
    this.factor = factor;
    this.epsilonOverK = epsilonOverK;
    this.internal = List.copyOf(internal);
    this.diluteViscosity = diluteViscosity;
    this.equation = equation;
    heatScale = Math.pow(reducingTemperature / equation.reducingTemperature(), 2);
  }

  @Override
  public double applyAsDouble(double temperature) {
    double cv = equation.idealCp(temperature) / equation.gasConstant() - 1;
    double coupling = internal.get(0) + internal.get(1) * epsilonOverK / temperature;
    double viscosity = 1e6 * diluteViscosity.applyAsDouble(temperature);
    return factor * viscosity * (3.75 + coupling * (heatScale * cv - 1.5));
  }
}
