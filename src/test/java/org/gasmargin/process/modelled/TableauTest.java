package org.gasmargin.process.modelled;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.function.IntToDoubleFunction;
import org.junit.jupiter.api.Test;

/** Order conditions of Runge-Kutta methods; textbook. */
class TableauTest {
  private static final int LAST = Tableau.STAGES - 1;

  @Test
  void resultIsOfThirdOrder() {
    assertEquals(1, sum(s -> Tableau.weight(LAST, s)), 1e-15);
    assertEquals(1.0 / 2, sum(s -> Tableau.weight(LAST, s) * Tableau.node(s)), 1e-15);
    assertEquals(1.0 / 3, sum(s -> Tableau.weight(LAST, s) * Math.pow(Tableau.node(s), 2)), 1e-15);
    assertEquals(1.0 / 6, sum(s -> Tableau.weight(LAST, s) * moment(s)), 1e-15);
  }

  @Test
  void embeddedResultIsOfSecondOrderAndNotOfThird() {
    assertEquals(1, sum(Tableau::embedded), 1e-12);
    assertEquals(1.0 / 2, sum(s -> Tableau.embedded(s) * Tableau.node(s)), 1e-12);
    double third = sum(s -> Tableau.embedded(s) * Math.pow(Tableau.node(s), 2)) - 1.0 / 3;
    assertEquals(0.0, Math.min(0, Math.abs(third) - 1e-3), 0);
  }

  @Test
  void stagesAreOfSecondOrder() {
    for (int stage = 1; stage < Tableau.STAGES; stage++) {
      int s = stage;
      assertEquals(Tableau.node(s), sum(e -> Tableau.weight(s, e)), 1e-15);
      assertEquals(Math.pow(Tableau.node(s), 2) / 2, moment(s), 1e-15);
    }
  }

  @Test
  void stiffDecayVanishesInOneStep() {
    double gamma = Tableau.DIAGONAL;
    assertEquals(0, gamma * gamma * gamma - 3 * gamma * gamma + 1.5 * gamma - 1.0 / 6, 1e-15);
    double stiff = -1e9;
    double[] y = new double[Tableau.STAGES];
    y[0] = 1;
    for (int s = 1; s < Tableau.STAGES; s++) {
      double known = 1;
      for (int e = 0; e < s; e++) {
        known += stiff * Tableau.weight(s, e) * y[e];
      }
      y[s] = known / (1 - stiff * gamma);
    }
    assertEquals(0, y[LAST], 1e-8);
  }

  private static double moment(int stage) {
    return sum(e -> Tableau.weight(stage, e) * Tableau.node(e));
  }

  private static double sum(IntToDoubleFunction term) {
    double sum = 0;
    for (int s = 0; s < Tableau.STAGES; s++) {
      sum += term.applyAsDouble(s);
    }
    return sum;
  }
}
