package org.gasmargin.gas.equation;

import java.util.List;

/**
 * Terms n Delta^b delta psi that give the heat capacity and the compressibility the steepness of
 * nature around the critical point, as in the equations of state of carbon dioxide and water by
 * Wagner and others. With x = delta - 1 and y = tau - 1:
 *
 * <ul>
 *   <li>psi = exp(-C x^2 - D y^2)
 *   <li>Delta = theta^2 + B (x^2)^a
 *   <li>theta = -y + A (x^2)^(1/(2 beta))
 * </ul>
 *
 * Far from the critical point they are left out where they cannot reach the last digit.
 */
public final class NonAnalyticTerms implements ResidualTerms {
  /** One term, named as in the formula of the class. */
  public record Term(
      double n,
      double a,
      double b,
      double beta,
      double capitalA,
      double capitalB,
      double capitalC,
      double capitalD) {}

  /** exp(-90) is below 1e-39. */
  private static final double NEGLIGIBLE_EXPONENT = -90;

  /** Distance kept from the one density at which the derivatives have no value. */
  private static final double ASIDE = 1e-10;

  private final Term[] terms;

  /** Keeps the terms. */
  public NonAnalyticTerms(List<Term> terms) {
    this.terms = terms.toArray(Term[]::new);
  }

  @Override
  public Evaluator evaluator() {
    return this::addTo;
  }

  private void addTo(ReducedSum sum, double tau, double delta) {
    double y = tau - 1;
    double x = y == 0 && Math.abs(delta - 1) < ASIDE ? ASIDE : delta - 1;
    for (Term term : terms) {
      double exponent = -term.capitalC * x * x - term.capitalD * y * y;
      if (exponent >= NEGLIGIBLE_EXPONENT) {
        add(sum, term, x, y, Math.exp(exponent));
      }
    }
  }

  private static void add(ReducedSum sum, Term term, double x, double y, double psi) {
    double delta = 1 + x;
    double tau = 1 + y;
    double x2 = x * x;

    // theta and Delta with their derivatives in delta; those in tau are -1 and -2 theta
    double thetaPower = term.capitalA * Math.pow(x2, 0.5 / term.beta - 1);
    double theta = -y + thetaPower * x2;
    double thetaD = thetaPower * x / term.beta;
    double thetaDd = thetaPower * (1 / term.beta - 1) / term.beta;
    double distancePower = term.capitalB * Math.pow(x2, term.a - 1);
    double distance = theta * theta + distancePower * x2;
    double distanceD = 2 * theta * thetaD + 2 * term.a * distancePower * x;
    double distanceDd =
        2 * thetaD * thetaD + 2 * theta * thetaDd + 2 * term.a * (2 * term.a - 1) * distancePower;
    double distanceT = -2 * theta;

    // w = Delta^b
    double w = Math.pow(distance, term.b);
    double w1 = term.b * w / distance;
    double w2 = (term.b - 1) * w1 / distance;
    double wD = w1 * distanceD;
    double wT = w1 * distanceT;
    double wDd = w2 * distanceD * distanceD + w1 * distanceDd;
    double wTt = w2 * distanceT * distanceT + 2 * w1;
    double wDt = w2 * distanceD * distanceT - 2 * w1 * thetaD;

    double psiD = -2 * term.capitalC * x * psi;
    double psiDd = 2 * term.capitalC * (2 * term.capitalC * x2 - 1) * psi;
    double psiT = -2 * term.capitalD * y * psi;
    double psiTt = 2 * term.capitalD * (2 * term.capitalD * y * y - 1) * psi;
    double psiDt = 4 * term.capitalC * term.capitalD * x * y * psi;

    // delta psi as one factor
    double first = psi + delta * psiD;
    double n = term.n * delta;
    sum.value += n * w * psi;
    sum.d += n * (w * first + wD * delta * psi);
    sum.dd += n * delta * (w * (2 * psiD + delta * psiDd) + 2 * wD * first + wDd * delta * psi);
    sum.t += n * tau * (wT * psi + w * psiT);
    sum.tt += n * tau * tau * (wTt * psi + 2 * wT * psiT + w * psiTt);
    sum.dt +=
        n * tau * (w * (psiT + delta * psiDt) + delta * wD * psiT + wT * first + wDt * delta * psi);
  }
}
