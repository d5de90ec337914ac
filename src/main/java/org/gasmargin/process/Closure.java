package org.gasmargin.process;

/**
 * What is left over in the balances of a step, the worst of its integrated paths.
 *
 * @param massRelative residual of mass over the largest mass in the step
 * @param energyRelative residual of energy over the largest term of the balance
 */
public record Closure(double massRelative, double energyRelative) {

  /** A step whose residual exceeds this is NOT ASSESSED. */
  public static final double BOUND = 1e-8;

  /** Whether both residuals are numbers within the bound. */
  public boolean holds() {
    return Math.abs(massRelative) <= BOUND && Math.abs(energyRelative) <= BOUND;
  }
}
