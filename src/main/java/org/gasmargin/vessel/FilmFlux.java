package org.gasmargin.vessel;

/**
 * Heat flux from the gas to the inner surface with the derivatives that an implicit solver needs.
 * The derivatives may neglect how the film's properties change with temperature; the flux may not.
 *
 * @param flux W/m2, positive from the gas to the wall
 * @param byGas derivative by the gas temperature, W/(m2 K)
 * @param bySurface derivative by the surface temperature, W/(m2 K)
 * @param byInflow derivative by the inflow, W s/(m2 kg)
 */
public record FilmFlux(double flux, double byGas, double bySurface, double byInflow) {}
