package org.gasmargin.gas.equation;

import java.util.List;

/** Ideal-gas terms n ln(1 - exp(-theta tau)): vibration of the molecule. */
public final class PlanckEinsteinTerms implements IdealTerms {
  /** One term; theta is the characteristic temperature divided by the reducing temperature. */
  public record Term(double n, double theta) {}

  private final Term[] terms;

  /** Keeps the terms. */
  public PlanckEinsteinTerms(List<Term> terms) {
    this.terms = terms.toArray(Term[]::new);
  }

  @Override
  public void addTo(ReducedSum sum, double tau) {
    for (Term term : terms) {
      double x = term.theta * tau;
      double e = Math.exp(-x);
      double occupation = e / (1 - e);
      sum.value += term.n * Math.log(1 - e);
      sum.t += term.n * x * occupation;
      sum.tt -= term.n * x * x * occupation / (1 - e);
    }
  }
}
