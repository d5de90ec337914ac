package org.gasmargin.gas.transport;

import java.util.List;
import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;

/**
 * Dense part of the viscosity, Pa s, by the generalised friction theory: powers of the ideal,
 * attractive and repulsive parts of the pressure, bar, with coefficients A0 + A1 psi1 + A2 psi2
 * times (Tr/T)^N, where psi1 = exp(Tr/T) - c1 and psi2 = exp((Tr/T)^2) - c2.
 *
 * @param gasConstant R of the equation of state, J/(mol K)
 * @param reducingTemperature Tr, K
 * @param c1 shift of psi1
 * @param c2 shift of psi2
 * @param terms the friction terms
 */
public record FrictionTheory(
    double gasConstant, double reducingTemperature, double c1, double c2, List<Term> terms)
    implements ToDoubleFunction<State> {
  private static final double PASCAL_PER_BAR = 1e5;

  /** Parts of the pressure that cause friction. */
  public enum PressurePart {
    /** rho R T. */
    IDEAL,
    /** p - T (dp/dT). */
    ATTRACTIVE,
    /** T (dp/dT) - rho R T. */
    REPULSIVE,
    /** T (dp/dT), the ideal and the repulsive part together. */
    THERMAL
  }

  /**
   * One friction term.
   *
   * @param part part of the pressure
   * @param power its power
   * @param a coefficients A0, A1, A2
   * @param n exponent N of Tr/T
   */
  public record Term(PressurePart part, int power, List<Double> a, double n) {}

  /** Copies the list. */
  public FrictionTheory {
    terms = List.copyOf(terms);
  }

  @Override
  public double applyAsDouble(State state) {
    double t = reducingTemperature / state.temperature();
    double psi1 = Math.exp(t) - c1;
    double psi2 = Math.exp(t * t) - c2;
    double sum = 0;
    for (Term term : terms) {
      double coefficient = term.a.get(0) + term.a.get(1) * psi1 + term.a.get(2) * psi2;
      sum += coefficient * Math.pow(t, term.n) * Math.pow(part(term.part, state), term.power);
    }
    return sum;
  }

  private double part(PressurePart part, State state) {
    double thermal = state.temperature() * state.dpdT();
    double ideal = state.molarDensity() * gasConstant * state.temperature();
    double pascal =
        switch (part) {
          case IDEAL -> ideal;
          case ATTRACTIVE -> state.pressure() - thermal;
          case REPULSIVE -> thermal - ideal;
          case THERMAL -> thermal;
        };
    return pascal / PASCAL_PER_BAR;
  }
}
