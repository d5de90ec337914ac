package org.gasmargin.process.modelled;

import static org.gasmargin.process.modelled.Jobs.hold;
import static org.gasmargin.process.modelled.Jobs.path;
import static org.gasmargin.process.modelled.Jobs.rampDown;
import static org.gasmargin.process.modelled.Jobs.supply;
import static org.gasmargin.process.modelled.Jobs.vessel;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.IdealGas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Step;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.Material;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;

/** Laws that hold for every job. */
class ModelledProperties {
  private static final GasCatalogue CATALOGUE = new GasCatalogue();
  private static final double AMBIENT = 293.15;

  @Provide
  Arbitrary<Gas> gases() {
    Arbitrary<Gas> perfect =
        Arbitraries.doubles().between(1.1, 1.67).map(ModelledProperties::perfectGas);
    Arbitrary<Gas> real =
        Arbitraries.of("nitrogen", "oxygen", "argon", "air", "helium", "hydrogen", "methane")
            .map(name -> CATALOGUE.find(name).orElseThrow());
    return Arbitraries.oneOf(perfect, real);
  }

  private static IdealGas perfectGas(double gamma) {
    return Jobs.perfectGas(gamma, 0.028).withTransport(1.8e-5, 0.026);
  }

  @Provide
  Arbitrary<Wall> walls() {
    Arbitrary<WallShape> shapes =
        Arbitraries.oneOf(
            Arbitraries.doubles().between(0.2, 3).map(WallShape.Plate::new),
            Arbitraries.doubles()
                .between(0.15, 0.5)
                .map(d -> new WallShape.Cylinder(d, 4 * d, false)),
            Arbitraries.doubles().between(0.3, 0.8).map(WallShape.Sphere::new));
    Arbitrary<List<Layer>> layers =
        Combinators.combine(materials(), Arbitraries.doubles().ofScale(4).between(0.001, 0.03))
            .as(Jobs::layer)
            .list()
            .ofMinSize(1)
            .ofMaxSize(3);
    Arbitrary<InsideFilm> inside =
        Arbitraries.oneOf(
            Arbitraries.doubles().between(1, 800).map(Jobs::inside),
            Arbitraries.of(new InsideFilm.Correlation()));
    Arbitrary<OutsideFilm> outside =
        Arbitraries.oneOf(
            Arbitraries.doubles().between(0, 500).map(Jobs::outside),
            Arbitraries.of(new OutsideFilm.StillAir(), new OutsideFilm.Wind(5)));
    return Combinators.combine(shapes, layers, inside, outside).as(Wall::new);
  }

  /** Materials from foam to aluminium, some of whose properties change with temperature. */
  private static Arbitrary<Material> materials() {
    return Combinators.combine(
            Arbitraries.doubles().between(50, 8000),
            Arbitraries.doubles().between(0.03, 200),
            Arbitraries.doubles().between(300, 2500),
            Arbitraries.doubles().between(-0.3, 0.5))
        .as(
            (density, conductivity, heatCapacity, rise) -> {
              List<Material.Point> points = new ArrayList<>();
              points.add(new Material.Point(250, conductivity, heatCapacity));
              if (Math.abs(rise) > 0.1) {
                points.add(
                    new Material.Point(350, conductivity * (1 + rise), heatCapacity * (1 + rise)));
              }
              return new Material("user material", density, points, "test");
            });
  }

  /** Fill, rest and vent; the fill starts from gas at ambient temperature. */
  private static List<Step> procedure(double rise, double seconds) {
    double top = 1e6 * (1 + rise);
    return List.of(
        Jobs.ramp(supply(1.2 * top, AMBIENT), top, seconds),
        hold(10 * seconds),
        rampDown(0.6 * top, seconds));
  }

  @Property(tries = 40, seed = "20261")
  void balancesCloseWhateverTheGasTheWallAndTheSteps(
      @ForAll("gases") Gas gas,
      @ForAll("walls") Wall wall,
      @ForAll @DoubleRange(min = 1, max = 20) double rise,
      @ForAll @DoubleRange(min = 1, max = 1000) double seconds) {
    ModelledVessel model = Jobs.model(vessel(gas, 0.05, 1e6, AMBIENT, wall), AMBIENT);
    VesselCondition condition = model.start();
    for (Step step : procedure(rise, seconds)) {
      ModelledStep result = model.run(step, condition);
      path(result);
      double energy = result.closure().orElseThrow().energyRelative();
      double mass = result.closure().orElseThrow().massRelative();
      assertTrue(Math.abs(energy) <= 1e-9, () -> step + " leaves energy of " + energy);
      assertTrue(Math.abs(mass) <= 1e-11, () -> step + " leaves mass of " + mass);
      condition = result.end().orElseThrow();
    }
  }

  @Property(tries = 40, seed = "20261")
  void perfectGasStaysBetweenItsBounds(
      @ForAll @DoubleRange(min = 1.1, max = 1.67) double gamma,
      @ForAll("walls") Wall wall,
      @ForAll @DoubleRange(min = 1, max = 20) double rise,
      @ForAll @DoubleRange(min = 1, max = 1000) double seconds) {
    IdealGas gas = perfectGas(gamma);
    Vessel vessel = vessel(gas, 0.05, 1e6, AMBIENT, wall);
    double top = 1e6 * (1 + rise);
    Path fill = path(Jobs.first(vessel, AMBIENT, Jobs.ramp(supply(1e8, AMBIENT), top, seconds)));
    for (PathPoint point : fill.points()) {
      double bound = gamma * AMBIENT / (1 + 1e6 / point.pressure() * (gamma - 1));
      assertTrue(point.temperature() <= bound * (1 + 1e-9), () -> point + " above " + bound);
      assertTrue(point.temperature() >= AMBIENT * (1 - 1e-9), () -> point + " below ambient");
    }
    Path vent = path(Jobs.first(vessel, AMBIENT, rampDown(2e5, seconds)));
    for (PathPoint point : vent.points()) {
      double bound = AMBIENT * Math.pow(point.pressure() / 1e6, (gamma - 1) / gamma);
      assertTrue(point.temperature() >= bound * (1 - 2e-6), () -> point + " below " + bound);
      assertTrue(point.temperature() <= AMBIENT * (1 + 1e-9), () -> point + " above ambient");
    }
  }

  @Property(tries = 20, seed = "20261")
  void verySlowStepsAreIsothermal(@ForAll("gases") Gas gas) {
    Wall wall = Jobs.plate(1.2, 100, 50, Jobs.layer(Jobs.STEEL, 0.006));
    ModelledVessel model = Jobs.model(vessel(gas, 0.05, 1e6, AMBIENT, wall), AMBIENT);
    ModelledStep fill = model.run(Jobs.ramp(supply(2e7, AMBIENT), 1e7, 1e7), model.start());
    assertEquals(AMBIENT, path(fill).peakGasTemperature(), 0.02);
    assertEquals(AMBIENT, path(fill).lowestGasTemperature(), 0.02);
    Path vent = path(model.run(rampDown(2e5, 1e7), fill.end().orElseThrow()));
    assertEquals(AMBIENT, vent.lowestGasTemperature(), 0.02);
  }

  @Property(tries = 20, seed = "20261")
  void veryFastStepsAreAdiabatic(@ForAll("gases") Gas gas) {
    Wall wall = Jobs.plate(1.2, 100, 50, Jobs.layer(Jobs.STEEL, 0.006));
    Wall tight = Jobs.plate(1.2, 0, 0, Jobs.layer(Jobs.STEEL, 0.006));
    for (Step step : List.of(Jobs.ramp(supply(2e7, AMBIENT), 1e7, 1e-4), rampDown(2e5, 1e-4))) {
      Path quick = path(Jobs.first(vessel(gas, 0.05, 1e6, AMBIENT, wall), AMBIENT, step));
      Path bound = path(Jobs.first(vessel(gas, 0.05, 1e6, AMBIENT, tight), AMBIENT, step));
      assertEquals(bound.last().temperature(), quick.last().temperature(), 0.01);
    }
  }

  @Property(tries = 20, seed = "20261")
  void weakerFilmNeverBringsThePeakDown(
      @ForAll("gases") Gas gas,
      @ForAll @DoubleRange(min = 5, max = 300) double film,
      @ForAll @DoubleRange(min = 10, max = 600) double seconds) {
    Step step = Jobs.ramp(supply(2e7, AMBIENT + 20), 1e7, seconds);
    double before = 0;
    for (double factor : new double[] {1.3, 1, 0.7}) {
      Wall wall = Jobs.plate(1.2, factor * film, 8, Jobs.layer(Jobs.STEEL, 0.006));
      double peak =
          path(Jobs.first(vessel(gas, 0.05, 1e6, AMBIENT, wall), AMBIENT, step))
              .peakGasTemperature();
      assertTrue(peak >= before - 1e-6, "peak " + peak + " under " + before);
      before = peak;
    }
  }
}
