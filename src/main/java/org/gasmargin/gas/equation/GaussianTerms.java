package org.gasmargin.gas.equation;

import java.util.List;

/**
 * Terms n delta^d tau^t exp(-eta (delta-epsilon)^2 - beta (tau-gamma)^2), which shape the region
 * around the critical point. Far from it they are left out where they cannot reach the last digit.
 */
public final class GaussianTerms implements ResidualTerms {
  /** One term, named as in the formula of the class. */
  public record Term(
      double n, double d, double t, double eta, double epsilon, double beta, double gamma) {}

  /** exp(-90) is below 1e-39. */
  private static final double NEGLIGIBLE_EXPONENT = -90;

  private final Term[] terms;
  private final PowerTable tauPowers;
  private final PowerTable deltaPowers;
  private final int[] tauSlot;
  private final int[] deltaSlot;

  /** Plans the powers of the terms. */
  public GaussianTerms(List<Term> terms) {
    this.terms = terms.toArray(Term[]::new);
    tauPowers = new PowerTable(terms.stream().mapToDouble(Term::t).toArray());
    deltaPowers = new PowerTable(terms.stream().mapToDouble(Term::d).toArray());
    tauSlot = terms.stream().mapToInt(term -> tauPowers.slot(term.t())).toArray();
    deltaSlot = terms.stream().mapToInt(term -> deltaPowers.slot(term.d())).toArray();
  }

  @Override
  public Evaluator evaluator() {
    return new Pass();
  }

  private final class Pass implements Evaluator {
    private final double[] tauValues = new double[tauPowers.size()];
    private final double[] deltaValues = new double[deltaPowers.size()];
    private double tauKept = Double.NaN;
    private double deltaKept = Double.NaN;

    private void move(double tau, double delta) {
      if (tau != tauKept) {
        tauPowers.fill(tau, tauValues);
        tauKept = tau;
      }
      if (delta != deltaKept) {
        deltaPowers.fill(delta, deltaValues);
        deltaKept = delta;
      }
    }

    @Override
    public void addTo(ReducedSum sum, double tau, double delta) {
      for (int i = 0; i < terms.length; i++) {
        Term term = terms[i];
        double dx = delta - term.epsilon;
        double ty = tau - term.gamma;
        double exponent = -term.eta * dx * dx - term.beta * ty * ty;
        if (exponent < NEGLIGIBLE_EXPONENT) {
          continue;
        }
        move(tau, delta);
        double f = term.n * deltaValues[deltaSlot[i]] * tauValues[tauSlot[i]] * Math.exp(exponent);
        double p = term.d - 2 * term.eta * delta * dx;
        double q = term.t - 2 * term.beta * tau * ty;
        sum.value += f;
        sum.d += f * p;
        sum.dd += f * (p * p - term.d - 2 * term.eta * delta * delta);
        sum.t += f * q;
        sum.tt += f * (q * q - term.t - 2 * term.beta * tau * tau);
        sum.dt += f * p * q;
      }
    }
  }
}
