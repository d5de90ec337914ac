package org.gasmargin.gas.equation;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.DoubleStream;

/**
 * Terms n delta^d tau^t exp(-delta^l); l = 0 means no exponential factor. Terms that share d and l
 * are summed over t first: those sums depend on tau alone and are kept while tau stays the same, so
 * a walk along an isotherm costs one short pass over the (l, d) groups.
 */
public final class PowerExponentialTerms implements ResidualTerms {
  /**
   * One term.
   *
   * @param n coefficient
   * @param d exponent of delta
   * @param t exponent of tau
   * @param l exponent of delta in the exponential, zero for none
   */
  public record Term(double n, double d, double t, int l) {}

  private final PowerTable tauPowers;
  private final PowerTable deltaPowers;

  // one entry per term
  private final double[] n;
  private final double[] t;
  private final double[] tt;
  private final int[] tauSlot;
  private final int[] sumSlot;

  // one entry per group of equal (l, d)
  private final double[] groupD;
  private final int[] groupDeltaSlot;
  private final int[] groupExponential;

  // one entry per distinct l
  private final double[] exponentialL;
  private final int[] exponentialSlot;

  /** Groups the terms and plans their powers. */
  public PowerExponentialTerms(List<Term> unsorted) {
    List<Term> terms =
        unsorted.stream()
            .sorted(Comparator.comparingInt(Term::l).thenComparingDouble(Term::d))
            .toList();
    tauPowers = new PowerTable(terms.stream().mapToDouble(Term::t).toArray());
    n = terms.stream().mapToDouble(Term::n).toArray();
    t = terms.stream().mapToDouble(Term::t).toArray();
    tt = terms.stream().mapToDouble(term -> term.t() * (term.t() - 1)).toArray();
    tauSlot = terms.stream().mapToInt(term -> tauPowers.slot(term.t())).toArray();

    double[] ls = terms.stream().mapToDouble(Term::l).distinct().toArray();
    double[] ds = terms.stream().mapToDouble(Term::d).toArray();
    deltaPowers =
        new PowerTable(DoubleStream.concat(Arrays.stream(ds), Arrays.stream(ls)).toArray());
    exponentialL = ls;
    exponentialSlot = Arrays.stream(ls).mapToInt(deltaPowers::slot).toArray();

    List<Term> groups = new ArrayList<>();
    sumSlot = new int[terms.size()];
    for (int i = 0; i < terms.size(); i++) {
      if (i == 0 || !sameGroup(terms.get(i - 1), terms.get(i))) {
        groups.add(terms.get(i));
      }
      sumSlot[i] = 3 * (groups.size() - 1);
    }
    groupD = groups.stream().mapToDouble(Term::d).toArray();
    groupDeltaSlot = groups.stream().mapToInt(group -> deltaPowers.slot(group.d())).toArray();
    groupExponential = groups.stream().mapToInt(g -> Arrays.binarySearch(ls, g.l())).toArray();
  }

  private static boolean sameGroup(Term a, Term b) {
    return a.l() == b.l() && a.d() == b.d();
  }

  @Override
  public Evaluator evaluator() {
    return new Pass();
  }

  private final class Pass implements Evaluator {
    private final double[] tauValues = new double[tauPowers.size()];
    private final double[] deltaValues = new double[deltaPowers.size()];
    private final double[] exponential = new double[exponentialL.length];

    /** Per group: sum of n tau^t, the same times t, the same times t (t-1). */
    private final double[] tauSums = new double[3 * groupD.length];

    private double tauKept = Double.NaN;
    private double deltaKept = Double.NaN;

    private void moveTau(double tau) {
      tauPowers.fill(tau, tauValues);
      Arrays.fill(tauSums, 0);
      for (int i = 0; i < n.length; i++) {
        double c = n[i] * tauValues[tauSlot[i]];
        int slot = sumSlot[i];
        tauSums[slot] += c;
        tauSums[slot + 1] += c * t[i];
        tauSums[slot + 2] += c * tt[i];
      }
      tauKept = tau;
    }

    private void moveDelta(double delta) {
      deltaPowers.fill(delta, deltaValues);
      for (int e = 0; e < exponential.length; e++) {
        exponential[e] = exponentialL[e] == 0 ? 1 : Math.exp(-deltaValues[exponentialSlot[e]]);
      }
      deltaKept = delta;
    }

    @Override
    public void addTo(ReducedSum sum, double tau, double delta) {
      if (tau != tauKept) {
        moveTau(tau);
      }
      if (delta != deltaKept) {
        moveDelta(delta);
      }
      double value = 0;
      double d = 0;
      double dd = 0;
      double t1 = 0;
      double t2 = 0;
      double dt = 0;
      for (int g = 0; g < groupD.length; g++) {
        int e = groupExponential[g];
        double l = exponentialL[e];
        double lx = l == 0 ? 0 : l * deltaValues[exponentialSlot[e]];
        double factor = deltaValues[groupDeltaSlot[g]] * exponential[e];
        double slope = groupD[g] - lx;
        double f = factor * tauSums[3 * g];
        double ft = factor * tauSums[3 * g + 1];
        value += f;
        d += f * slope;
        dd += f * (slope * (slope - 1) - l * lx);
        t1 += ft;
        t2 += factor * tauSums[3 * g + 2];
        dt += ft * slope;
      }
      sum.value += value;
      sum.d += d;
      sum.dd += dd;
      sum.t += t1;
      sum.tt += t2;
      sum.dt += dt;
    }
  }
}
