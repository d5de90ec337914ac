package org.gasmargin.process.modelled;

/**
 * A system d/dt y(z) = f(t, z) in conserved quantities y of unknowns z, of which some are set by
 * algebraic equations. An unknown whose rate is not known by itself (the inflow that keeps a
 * prescribed pressure) is found from its change over the stage.
 */
interface StageSystem {

  /** Number of unknowns. */
  int size();

  /** Number of flows that are summed over time beside the unknowns. */
  int flowCount();

  /** Conserved quantities of the unknowns; zero where the equation is algebraic. */
  void conserved(double[] z, double[] y);

  /**
   * Residual of one implicit stage, y(z) - known - weight f(t, z) or that of an algebraic equation,
   * with its derivatives.
   */
  void stage(
      double time, double[] z, double[] known, double weight, double[] residual, BandMatrix matrix);

  /**
   * Turns an error in the conserved quantities into the right-hand side that it is for the
   * equations of a stage; zero where these are algebraic.
   */
  void errorToRightHandSide(double[] z, double[] error);

  /** Rates dy/dt at unknowns that satisfy the algebraic equations. */
  void rates(double time, double[] z, double[] rates);

  /** Changes the unknowns that hold nothing so that they satisfy their algebraic equations. */
  void makeConsistent(double[] z);

  /** Turns rates dy/dt into dz/dt; zero for an unknown that is set by an algebraic equation. */
  void slopes(double[] z, double[] rates, double[] slopes);

  /** Flows, per s, of a state whose rates are known. */
  void flows(double time, double[] z, double[] rates, double[] flows);

  /** The size against which an error in an unknown is measured. */
  double magnitude(int unknown, double[] z);

  /**
   * Refuses a solution that the model does not allow.
   *
   * @throws org.gasmargin.gas.OutsideValidity with the reason
   */
  void check(double time, double[] z, double[] rates);
}
