package org.gasmargin.process;

/** The ways in which every step is computed. */
public enum PathKind {
  /** The gas stays at the temperature of the wall at the start. */
  ISOTHERMAL,
  /** No heat passes; a fill takes the hottest supply of the tolerance. */
  ADIABATIC,
  /** Heat passes into the wall by published correlations or given coefficients. */
  MODELLED,
  /** Gas that is pushed ahead of the incoming gas and does not mix with it. */
  UNMIXED
}
