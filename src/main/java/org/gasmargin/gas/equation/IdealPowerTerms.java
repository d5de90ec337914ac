package org.gasmargin.gas.equation;

import java.util.List;

/** Ideal-gas terms n tau^t; t may be zero or negative. */
public final class IdealPowerTerms implements IdealTerms {
  /** One term n tau^t. */
  public record Term(double n, double t) {}

  private final Term[] terms;

  /** Keeps the terms. */
  public IdealPowerTerms(List<Term> terms) {
    this.terms = terms.toArray(Term[]::new);
  }

  @Override
  public void addTo(ReducedSum sum, double tau) {
    for (Term term : terms) {
      double f = term.n * power(tau, term.t);
      sum.value += f;
      sum.t += f * term.t;
      sum.tt += f * term.t * (term.t - 1);
    }
  }

  /** Small whole exponents are the rule here. */
  private static double power(double tau, double t) {
    if (t != Math.rint(t) || Math.abs(t) > 4) {
      return Math.pow(tau, t);
    }
    double result = 1;
    for (int i = 0; i < Math.abs(t); i++) {
      result *= tau;
    }
    return t < 0 ? 1 / result : result;
  }
}
