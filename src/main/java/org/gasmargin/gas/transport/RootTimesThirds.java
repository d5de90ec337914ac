package org.gasmargin.gas.transport;

import java.util.function.DoubleUnaryOperator;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Viscosity of the dilute gas at T, K: C sqrt(T*) sum a T*^(i/3) with T* = T/(epsilon/k), in the
 * unit of C.
 *
 * @param factor C
 * @param epsilonOverK depth of the molecule's potential, K
 * @param terms rows a, i
 */
public record RootTimesThirds(double factor, double epsilonOverK, PowerSum terms)
    implements DoubleUnaryOperator {
  @Override
  public double applyAsDouble(double temperature) {
    double reduced = temperature / epsilonOverK;
    return factor * Math.sqrt(reduced) * terms.at(Math.cbrt(reduced));
  }
}
