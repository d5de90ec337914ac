package org.gasmargin.gas.phase;

/** Where a fluid has a gap between gas and liquid. Immutable. */
public interface PhaseBoundary {
  /** Lowest temperature from which on there is no gap, K. */
  double gapCloses();

  /** The gap at a temperature below {@link #gapCloses}, K. */
  PhaseEnds endsAt(double temperature);

  /**
   * Whether a point of the equation is a stable gas or liquid.
   *
   * @param temperature below {@link #gapCloses}, K
   * @param density mol/m3
   * @param pressure that the equation gives there, Pa
   */
  boolean isStable(double temperature, double density, double pressure);
}
