package org.gasmargin.gas.equation;

/** Terms of one kind in the residual part of an equation of state. Immutable. */
public interface ResidualTerms {
  /** A fresh evaluator, to be used by one thread. */
  Evaluator evaluator();

  /**
   * Evaluates the terms at one point after another. It may keep what depends on tau alone or delta
   * alone between calls.
   */
  interface Evaluator {
    /** Adds the value and the scaled derivatives at tau, delta (both above zero) to the sum. */
    void addTo(ReducedSum sum, double tau, double delta);
  }
}
