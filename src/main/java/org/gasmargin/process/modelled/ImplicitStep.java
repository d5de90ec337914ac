package org.gasmargin.process.modelled;

import java.util.Optional;
import org.gasmargin.gas.OutsideValidity;

/** Takes one step of the method of {@link Tableau}: stages, Newton iteration, error estimate. */
final class ImplicitStep {
  private static final int MAX_ITERATIONS = 12;

  /** Largest change of an unknown, relative to its magnitude, that may be left out. */
  private static final double NEWTON_TOLERANCE = 1e-12;

  /** Change at which an iteration that no longer improves has met the limits of arithmetic. */
  private static final double NEWTON_FLOOR = 1e-10;

  private final StageSystem system;
  private final BandMatrix matrix;
  private final double[] residual;
  private final double[] known;
  private final double[] start;
  private final double[] content;
  private final double[][] rates;
  private final double[] flows;
  private String failure = "no step was tried";

  ImplicitStep(StageSystem system) {
    int size = system.size();
    this.system = system;
    this.matrix = new BandMatrix(size);
    this.residual = new double[size];
    this.known = new double[size];
    this.start = new double[size];
    this.content = new double[size];
    this.rates = new double[Tableau.STAGES][size];
    this.flows = new double[system.flowCount()];
  }

  /**
   * What one step leads to.
   *
   * @param z unknowns at its end
   * @param error estimated error of each unknown over its magnitude, the largest
   * @param flows what has flowed during the step
   */
  @SuppressWarnings("ArrayRecordComponent") // never compared, never handed out of the package
  record Advance(double[] z, double error, double[] flows) {}

  /** Why the last step was refused. */
  String failure() {
    return failure;
  }

  /**
   * One step.
   *
   * @param time at its start
   * @param z unknowns at its start, consistent
   * @param startRates rates at its start
   * @param step length
   * @return empty if an equation could not be solved; {@link #failure} then says why
   */
  Optional<Advance> from(double time, double[] z, double[] startRates, double step) {
    try {
      return tried(time, z, startRates, step);
    } catch (OutsideValidity outside) {
      failure = String.valueOf(outside.getMessage());
      return Optional.empty();
    }
  }

  private Optional<Advance> tried(double time, double[] z, double[] startRates, double step) {
    int size = system.size();
    double weight = step * Tableau.DIAGONAL;
    double[] stage = z.clone();
    double[] sums = new double[flows.length];
    system.conserved(z, start);
    System.arraycopy(startRates, 0, rates[0], 0, size);
    addFlows(time, z, 0, step, sums);
    for (int s = 1; s < Tableau.STAGES; s++) {
      for (int i = 0; i < size; i++) {
        double sum = 0;
        for (int earlier = 0; earlier < s; earlier++) {
          sum += Tableau.weight(s, earlier) * rates[earlier][i];
        }
        known[i] = start[i] + step * sum;
      }
      double stageTime = time + step * Tableau.node(s);
      if (!solve(stageTime, stage, weight)) {
        failure = "the equations of gas and wall did not converge";
        return Optional.empty();
      }
      system.conserved(stage, content);
      for (int i = 0; i < size; i++) {
        rates[s][i] = (content[i] - known[i]) / weight;
      }
      addFlows(stageTime, stage, s, step, sums);
    }
    return Optional.of(new Advance(stage, error(stage, step), sums));
  }

  /** Newton's method from the unknowns in {@code z}, which it replaces. */
  private boolean solve(double time, double[] z, double weight) {
    double before = Double.POSITIVE_INFINITY;
    for (int iteration = 0; iteration < MAX_ITERATIONS; iteration++) {
      matrix.clear();
      system.stage(time, z, known, weight, residual, matrix);
      matrix.factorise();
      matrix.solve(residual);
      double change = 0;
      for (int i = 0; i < z.length; i++) {
        change = Math.max(change, Math.abs(residual[i]) / system.magnitude(i, z));
        z[i] -= residual[i];
      }
      if (!(change < 0.5)) {
        return false;
      }
      double speed = change / before;
      if (change <= NEWTON_TOLERANCE
          || (iteration > 0 && speed < 1 && change * speed / (1 - speed) <= NEWTON_TOLERANCE)
          || (speed > 0.5 && change <= NEWTON_FLOOR)) {
        return true;
      }
      before = change;
    }
    return false;
  }

  private void addFlows(double time, double[] z, int stage, double step, double[] sums) {
    system.flows(time, z, rates[stage], flows);
    for (int i = 0; i < sums.length; i++) {
      sums[i] += step * Tableau.weight(Tableau.STAGES - 1, stage) * flows[i];
    }
  }

  /**
   * The difference to the embedded result, passed through the matrix of the last stage so that what
   * has decayed in the wall does not count and what is bound by an equation stays bound.
   */
  private double error(double[] z, double step) {
    for (int i = 0; i < residual.length; i++) {
      double sum = 0;
      for (int s = 0; s < Tableau.STAGES; s++) {
        double difference = Tableau.weight(Tableau.STAGES - 1, s) - Tableau.embedded(s);
        sum += difference * rates[s][i];
      }
      residual[i] = step * sum;
    }
    system.errorToRightHandSide(z, residual);
    matrix.solve(residual);
    double worst = 0;
    for (int i = 0; i < residual.length; i++) {
      double relative = Math.abs(residual[i]) / system.magnitude(i, z);
      worst = Double.isNaN(relative) ? Double.POSITIVE_INFINITY : Math.max(worst, relative);
    }
    return worst;
  }
}
