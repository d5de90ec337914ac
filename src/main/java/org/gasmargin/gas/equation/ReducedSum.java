package org.gasmargin.gas.equation;

/**
 * Running sum of a reduced Helmholtz energy alpha(tau, delta) and its scaled derivatives. One
 * evaluation writes it; it never leaves the thread that made it.
 */
public final class ReducedSum {
  /** alpha. */
  double value;

  /** delta alpha_delta. */
  double d;

  /** delta^2 alpha_delta,delta. */
  double dd;

  /** tau alpha_tau. */
  double t;

  /** tau^2 alpha_tau,tau. */
  double tt;

  /** delta tau alpha_delta,tau. */
  double dt;

  void clear() {
    value = 0;
    d = 0;
    dd = 0;
    t = 0;
    tt = 0;
    dt = 0;
  }
}
