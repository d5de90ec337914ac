package org.gasmargin.vessel;

import org.gasmargin.gas.State;

/** What sets the heat flux from the gas to the inner surface. */
public interface FilmLaw {

  /**
   * Heat flux from well-mixed gas to the inner surface.
   *
   * @param gas state of the gas
   * @param surface temperature of the inner surface, K
   * @param inflow mass flow of the jet that stirs the gas, kg/s, zero or above
   * @throws org.gasmargin.gas.OutsideValidity if the film's properties cannot be had
   */
  FilmFlux flux(State gas, double surface, double inflow);

  /** A constant coefficient, W/(m2 K), zero or above. */
  record Constant(double coefficient) implements FilmLaw {

    /** Refuses a coefficient that is negative or not finite. */
    public Constant {
      if (!(coefficient >= 0 && Double.isFinite(coefficient))) {
        throw new IllegalArgumentException("a film coefficient must be finite and not negative");
      }
    }

    @Override
    public FilmFlux flux(State gas, double surface, double inflow) {
      return new FilmFlux(
          coefficient * (gas.temperature() - surface), coefficient, -coefficient, 0);
    }
  }
}
