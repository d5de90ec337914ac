package org.gasmargin.vessel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.vessel.JetAndNaturalConvection.Numbers;
import org.junit.jupiter.api.Test;

/**
 * The film inside. The correlation is published (Woodfield and others 2007, 2008, coefficients from
 * memory); what is held here is that it is computed as written.
 */
class InsideFilmTest {
  private static final WallShape CYLINDER = new WallShape.Cylinder(0.229, 1.4, false);
  private static final Gas NITROGEN = new GasCatalogue().find("nitrogen").orElseThrow();

  private static JetAndNaturalConvection film(OptionalDouble bore) {
    return new JetAndNaturalConvection(NITROGEN, CYLINDER, bore, 1);
  }

  @Test
  void coefficientFollowsTheCorrelationWithRealGasProperties() {
    State gas = NITROGEN.atTemperaturePressure(340, 1e7);
    State mean = NITROGEN.atTemperaturePressure(320, 1e7);
    double viscosity = NITROGEN.viscosity(mean);
    double conductivity = NITROGEN.thermalConductivity(mean);
    double massDensity = mean.molarDensity() * NITROGEN.molarMass();
    double reynolds = 4 * 0.05 / (Math.PI * 0.005 * viscosity);
    double grashof =
        9.80665
            * mean.expansivity()
            * 40
            * Math.pow(0.229, 3)
            / Math.pow(viscosity / massDensity, 2);
    double prandtl = mean.cp() / NITROGEN.molarMass() * viscosity / conductivity;
    double nusselt = 0.56 * Math.pow(reynolds, 0.67) + 0.104 * Math.pow(grashof * prandtl, 0.352);
    double expected = nusselt * conductivity / 0.229 * 40;
    JetAndNaturalConvection film = film(OptionalDouble.of(0.005));
    assertEquals(expected, film.flux(gas, 300, 0.05).flux(), 1e-6 * expected);
    Numbers numbers = film.numbers(gas, 300, 0.05);
    assertEquals(reynolds, numbers.jetReynolds(), 1e-9 * reynolds);
    assertEquals(grashof * prandtl, numbers.rayleigh(), 1e-9 * grashof * prandtl);
  }

  /** Order of magnitude: computed elsewhere for steel cylinders, 100 to 400 W/(m2 K). */
  @Test
  void denseGasAtTheStartOfAVentHasAFilmOfHundreds() {
    State gas = NITROGEN.atTemperaturePressure(263, 1.5e7);
    double coefficient = film(OptionalDouble.empty()).flux(gas, 293, 0).flux() / (263 - 293);
    assertTrue(coefficient > 100 && coefficient < 400, "film " + coefficient);
  }

  /** Order of magnitude: computed elsewhere, 3 to 10 W/(m2 K) at 1 to 5 bar. */
  @Test
  void thinGasAtTheEndOfAVentHasAFilmOfAFew() {
    State gas = NITROGEN.atTemperaturePressure(263, 2e5);
    double coefficient = film(OptionalDouble.empty()).flux(gas, 293, 0).flux() / (263 - 293);
    assertTrue(coefficient > 3 && coefficient < 10, "film " + coefficient);
  }

  @Test
  void withoutABoreNoJetIsCredited() {
    State gas = NITROGEN.atTemperaturePressure(340, 1e7);
    double still = film(OptionalDouble.empty()).flux(gas, 300, 0).flux();
    assertEquals(still, film(OptionalDouble.empty()).flux(gas, 300, 0.05).flux());
    assertEquals(still, film(OptionalDouble.of(0.005)).flux(gas, 300, 0).flux());
    assertTrue(film(OptionalDouble.of(0.005)).flux(gas, 300, 0.05).flux() > 1.5 * still);
  }

  @Test
  void heatPassesNeitherWayAtEqualTemperatures() {
    State gas = NITROGEN.atTemperaturePressure(300, 1e7);
    FilmFlux flux = film(OptionalDouble.of(0.005)).flux(gas, 300, 0.05);
    assertEquals(0, flux.flux());
    assertTrue(Double.isFinite(flux.byGas()) && flux.byGas() > 0);
  }

  @Test
  void slopesAreNearTheDerivatives() {
    State gas = NITROGEN.atTemperaturePressure(340, 1e7);
    JetAndNaturalConvection film = film(OptionalDouble.of(0.005));
    FilmFlux flux = film.flux(gas, 300, 0.05);
    double bySurface =
        (film.flux(gas, 300.01, 0.05).flux() - film.flux(gas, 299.99, 0.05).flux()) / 0.02;
    double byInflow =
        (film.flux(gas, 300, 0.0501).flux() - film.flux(gas, 300, 0.0499).flux()) / 0.0002;
    assertEquals(bySurface, flux.bySurface(), 0.1 * Math.abs(bySurface));
    assertEquals(byInflow, flux.byInflow(), 1e-4 * byInflow);
  }
}
