package org.gasmargin.gas.transport;

import java.util.function.DoubleUnaryOperator;
import org.gasmargin.gas.equation.PowerSum;

/**
 * Second viscosity virial coefficient, m3/mol, by the theory of Rainwater and Friend: NA sigma^3
 * sum b T*^t with T* = T/(epsilon/k).
 *
 * @param volume NA sigma^3, m3/mol
 * @param epsilonOverK depth of the molecule's potential, K
 * @param terms rows b, t
 */
public record RainwaterFriend(double volume, double epsilonOverK, PowerSum terms)
    implements DoubleUnaryOperator {
  @Override
  public double applyAsDouble(double temperature) {
    return volume * terms.at(temperature / epsilonOverK);
  }
}
