package org.gasmargin.vessel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.units.Interval;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Heat transfer to the surroundings against worked examples and other correlations. */
class OutsideExchangeTest {
  private static final double THIN = 1e-6;
  private static final double ATMOSPHERE = 101325;
  private static final Material STEEL =
      new Material("steel", 7850, List.of(new Material.Point(293.15, 45, 470)), "test");

  private static OutsideExchange outside(WallShape shape, OutsideFilm film, double ambient) {
    Wall wall =
        new Wall(
            shape,
            List.of(new Layer(STEEL, Interval.exactly(THIN))),
            new InsideFilm.Correlation(),
            film);
    return new OutsideExchange(wall, THIN, ambient, ATMOSPHERE, 0);
  }

  private static double radiation(double surface, double ambient) {
    return 0.85 * 5.670374419e-8 * (Math.pow(surface, 4) - Math.pow(ambient, 4));
  }

  /**
   * Steam line of 0.1 m at 165 degC in air of 23 degC: Ra 5.07e6, Nu 23.3 with a conductivity of
   * 0.0313 W/(m K). Incropera and others, worked example of free convection from a horizontal
   * cylinder; value from memory.
   */
  @Test
  void horizontalSteamLineLosesWhatTheTextbookSays() {
    OutsideExchange line =
        outside(new WallShape.Cylinder(0.1, 100, true), new OutsideFilm.StillAir(), 296.15);
    double convection = line.flux(438.15).flux() - radiation(438.15, 296.15);
    assertEquals(23.3, convection / 142 * 0.1 / 0.0313, 0.02 * 23.3);
  }

  /**
   * Cylinder of 12.7 mm at 128.4 degC in air of 26.2 degC at 10 m/s: Nu 40.6, 96 W/(m2 K).
   * Incropera and others, worked example of cross flow; value from memory.
   */
  @Test
  void cylinderInCrossFlowLosesWhatTheTextbookSays() {
    OutsideExchange rod =
        outside(new WallShape.Cylinder(0.0127, 10, true), new OutsideFilm.Wind(10), 299.35);
    double convection = rod.flux(401.55).flux() - radiation(401.55, 299.35);
    assertEquals(96, convection / 102.2, 0.02 * 96);
  }

  /** Turbulent plate against McAdams, Nu = 0.13 Ra^(1/3); textbook form, within a fifth. */
  @Test
  void tallUprightSurfaceIsNearTheTurbulentForm() {
    OutsideExchange plate = outside(new WallShape.Plate(9), new OutsideFilm.StillAir(), 293.15);
    double convection = (plate.flux(333.15).flux() - radiation(333.15, 293.15)) / 40;
    FluidTable.Properties film = FluidTable.AIR.at(313.15, ATMOSPHERE);
    double mcAdams = 0.13 * Math.cbrt(film.rayleigh(3, 40)) * film.conductivity() / 3;
    assertEquals(mcAdams, convection, 0.2 * mcAdams);
  }

  /** Still water around a cylinder: 300 to 800 W/(m2 K), common practice. */
  @Test
  void stillWaterBathCarriesHundreds() {
    OutsideExchange bath =
        outside(new WallShape.Cylinder(0.229, 1.4, false), new OutsideFilm.WaterBath(), 293.15);
    double coefficient = bath.flux(308.15).flux() / 15;
    assertTrue(coefficient > 300 && coefficient < 800, "film " + coefficient);
  }

  @Test
  void waterBathThatWouldFreezeOrBoilIsRefused() {
    OutsideExchange bath =
        outside(new WallShape.Cylinder(0.229, 1.4, false), new OutsideFilm.WaterBath(), 293.15);
    assertThrows(OutsideValidity.class, () -> bath.flux(272));
    assertThrows(OutsideValidity.class, () -> bath.flux(374));
  }

  @Test
  void calmWindIsStillAir() {
    WallShape shape = new WallShape.Cylinder(0.3, 1.4, true);
    double still = outside(shape, new OutsideFilm.StillAir(), 293.15).flux(313.15).flux();
    double calm = outside(shape, new OutsideFilm.Wind(0.01), 293.15).flux(313.15).flux();
    double storm = outside(shape, new OutsideFilm.Wind(10), 293.15).flux(313.15).flux();
    assertEquals(still, calm, 1e-2 * still);
    assertTrue(storm > 3 * still);
  }

  @Test
  void insulatedSurfaceLosesNothing() {
    OutsideExchange wrapped =
        outside(new WallShape.Sphere(0.3), new OutsideFilm.Insulated(), 293.15);
    assertEquals(0, wrapped.flux(400).flux());
    assertTrue(wrapped.correlation().isEmpty());
  }

  @Test
  void uncertaintyOfACorrelationWidensItsCoefficient() {
    Wall wall =
        new Wall(
            new WallShape.Plate(1),
            List.of(new Layer(STEEL, Interval.exactly(THIN))),
            new InsideFilm.Correlation(),
            new OutsideFilm.StillAir());
    double low = new OutsideExchange(wall, THIN, 293.15, ATMOSPHERE, -1).flux(313.15).flux();
    double high = new OutsideExchange(wall, THIN, 293.15, ATMOSPHERE, 1).flux(313.15).flux();
    assertEquals(1.25 / 0.75, high / low, 1e-12);
  }

  @ParameterizedTest
  @ValueSource(doubles = {200, 260, 293.15, 293.151, 340, 420})
  void slopeIsNearTheDerivative(double surface) {
    for (WallShape shape :
        List.of(
            new WallShape.Plate(1),
            new WallShape.Cylinder(0.3, 1, true),
            new WallShape.Sphere(0.5))) {
      OutsideExchange air = outside(shape, new OutsideFilm.Wind(1), 293.15);
      double nudge = 1e-5;
      double slope =
          (air.flux(surface + nudge).flux() - air.flux(surface - nudge).flux()) / (2 * nudge);
      assertEquals(slope, air.flux(surface).bySurface(), 0.1 * slope);
    }
  }

  /** The table against the transport correlations of the gas room, another published source. */
  @ParameterizedTest
  @ValueSource(doubles = {200, 250, 300, 350, 400, 500})
  void airOfTheTableIsTheAirOfTheGasRoom(double temperature) {
    Gas air = new GasCatalogue().find("air").orElseThrow();
    State state = air.atTemperaturePressure(temperature, ATMOSPHERE);
    FluidTable.Properties film = FluidTable.AIR.at(temperature, ATMOSPHERE);
    assertEquals(air.viscosity(state), film.viscosity(), 0.02 * film.viscosity());
    assertEquals(air.thermalConductivity(state), film.conductivity(), 0.03 * film.conductivity());
    double density = state.molarDensity() * air.molarMass();
    assertEquals(density, film.density(), 0.005 * density);
    double prandtl =
        state.cp() / air.molarMass() * air.viscosity(state) / air.thermalConductivity(state);
    assertEquals(prandtl, film.prandtl(), 0.04 * prandtl);
  }
}
