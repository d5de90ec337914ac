package org.gasmargin.gas.equation;

/** Ideal-gas term a ln(tau): the heat capacity that does not change with temperature. */
public record LogTauTerm(double a) implements IdealTerms {
  @Override
  public void addTo(ReducedSum sum, double tau) {
    sum.value += a * Math.log(tau);
    sum.t += a;
    sum.tt -= a;
  }
}
