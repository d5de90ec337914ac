package org.gasmargin.gas.equation;

/** Ideal-gas term a1 + a2 tau, which carries the datum of entropy and energy. */
public record LeadTerm(double a1, double a2) implements IdealTerms {
  @Override
  public void addTo(ReducedSum sum, double tau) {
    sum.value += a1 + a2 * tau;
    sum.t += a2 * tau;
  }
}
