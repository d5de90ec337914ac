package org.gasmargin.gas.equation;

import java.util.List;

/**
 * Terms n delta^d tau^t exp(eta (delta-epsilon)^2 + 1/(b + beta (tau-gamma)^2)) of the equation of
 * state of ammonia by Gao and others; eta is below zero. Far from the critical density they are
 * left out where they cannot reach the last digit.
 */
public final class GaoTerms implements ResidualTerms {
  /** One term, named as in the formula of the class. */
  public record Term(
      double n,
      double d,
      double t,
      double eta,
      double epsilon,
      double beta,
      double gamma,
      double b) {}

  /** exp(-90) is below 1e-39. */
  private static final double NEGLIGIBLE_EXPONENT = -90;

  private final Term[] terms;

  /** Keeps the terms. */
  public GaoTerms(List<Term> terms) {
    this.terms = terms.toArray(Term[]::new);
  }

  @Override
  public Evaluator evaluator() {
    return this::addTo;
  }

  private void addTo(ReducedSum sum, double tau, double delta) {
    for (Term term : terms) {
      double dx = delta - term.epsilon;
      double ty = tau - term.gamma;
      double g = term.b + term.beta * ty * ty;
      double exponent = term.eta * dx * dx + 1 / g;
      if (exponent < NEGLIGIBLE_EXPONENT) {
        continue;
      }
      double f = term.n * Math.pow(delta, term.d) * Math.pow(tau, term.t) * Math.exp(exponent);
      // tau times the slope of 1/g, and tau^2 times its second derivative
      double slope = -2 * term.beta * tau * ty / (g * g);
      double bend = -2 * term.beta * tau * tau / (g * g) + 2 * slope * slope * g;
      double p = term.d + 2 * term.eta * delta * dx;
      double q = term.t + slope;
      sum.value += f;
      sum.d += f * p;
      sum.dd += f * (p * p - term.d + 2 * term.eta * delta * delta);
      sum.t += f * q;
      sum.tt += f * (q * q - term.t + bend);
      sum.dt += f * p * q;
    }
  }
}
