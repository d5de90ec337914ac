package org.gasmargin.gas.equation;

import org.gasmargin.gas.OutsideValidity;

/**
 * Newton's method held inside a bracket: the root of a rising function is found from any start, and
 * a step that would leave the bracket, or shrinks too slowly, is replaced by bisection.
 */
public final class BracketedNewton {
  /** A rising function of one variable. */
  public interface Rising {
    /** Evaluates the function at x; the two other methods refer to this x. */
    void moveTo(double x);

    /** Value less target. */
    double excess();

    /** Derivative, above zero near the root. */
    double slope();
  }

  private static final int MAX_STEPS = 200;

  /** Newton doubles the digits, so a step of this relative size leaves nothing to gain. */
  private static final double LAST_STEP = 1e-9;

  private BracketedNewton() {}

  /**
   * Finds the root.
   *
   * @param function rising over the bracket, below zero at its low end, above zero at its high end
   * @param low low end, not below zero
   * @param high high end
   * @param guess start, anywhere
   * @return the root to about 1e-14 relative, where the function allows
   */
  public static double solve(Rising function, double low, double high, double guess) {
    double a = low;
    double b = high;
    double x = guess >= a && guess <= b ? guess : 0.5 * (a + b);
    double previousStep = b - a;
    for (int i = 0; i < MAX_STEPS; i++) {
      function.moveTo(x);
      double excess = function.excess();
      if (excess == 0) {
        return x;
      }
      if (excess < 0) {
        a = x;
      } else if (excess > 0) {
        b = x;
      } else {
        throw new OutsideValidity("the iteration met a state that the equation cannot evaluate");
      }
      double step = -excess / function.slope();
      double next = x + step;
      boolean newton = next > a && next < b && Math.abs(step) < 0.8 * previousStep;
      if (Math.abs(step) <= LAST_STEP * x && function.slope() > 0) {
        return Math.min(Math.max(next, a), b);
      }
      if (!newton) {
        next = 0.5 * (a + b);
        if (b - a <= 1e-15 * b || next <= a || next >= b) {
          return next;
        }
      }
      previousStep = Math.abs(next - x);
      x = next;
    }
    throw new OutsideValidity("the iteration for a state did not converge");
  }
}
