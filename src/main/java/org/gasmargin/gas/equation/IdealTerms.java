package org.gasmargin.gas.equation;

/**
 * Terms of one kind in the ideal-gas part alpha0 of an equation of state, without ln(delta), which
 * is always there. Immutable.
 */
public interface IdealTerms {
  /** Adds the value, tau alpha0_tau and tau^2 alpha0_tau,tau at tau (above zero) to the sum. */
  void addTo(ReducedSum sum, double tau);
}
