package org.gasmargin.gas.equation;

import java.util.List;

/** Ideal-gas terms n ln(c + d exp(t tau)). */
public final class PlanckEinsteinGeneralTerms implements IdealTerms {
  /** One term, named as in the formula of the class. */
  public record Term(double n, double t, double c, double d) {}

  private final Term[] terms;

  /** Keeps the terms. */
  public PlanckEinsteinGeneralTerms(List<Term> terms) {
    this.terms = terms.toArray(Term[]::new);
  }

  @Override
  public void addTo(ReducedSum sum, double tau) {
    for (Term term : terms) {
      double x = term.t * tau;
      double share = term.d / (term.c * Math.exp(-x) + term.d);
      sum.value += term.n * (x + Math.log(term.c * Math.exp(-x) + term.d));
      sum.t += term.n * x * share;
      sum.tt += term.n * x * x * share * (1 - share);
    }
  }
}
