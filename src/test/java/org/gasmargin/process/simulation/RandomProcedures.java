package org.gasmargin.process.simulation;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.Supply;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.Material;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;

/** Random but sensible jobs of one vessel with a wall. */
final class RandomProcedures {
  private static final double BAR = 1e5;
  private static final List<String> GASES =
      List.of("nitrogen", "oxygen", "argon", "air", "helium", "hydrogen", "methane");

  private RandomProcedures() {}

  static Procedure of(Random random) {
    Gas gas = new GasCatalogue().find(GASES.get(random.nextInt(GASES.size()))).orElseThrow();
    double ambient = 285 + 20 * random.nextDouble();
    double start = (3 + 60 * random.nextDouble()) * BAR;
    Vessel vessel =
        new Vessel(
            "v",
            gas,
            Interval.exactly(0.02 + 0.1 * random.nextDouble()),
            Interval.exactly(start),
            Interval.exactly(ambient + 6 * (random.nextDouble() - 0.5)),
            Interval.exactly(ambient),
            Optional.of(wall(random)));
    List<Step> steps = new ArrayList<>();
    double pressure = start;
    int count = 1 + random.nextInt(3);
    for (int i = 1; i <= count; i++) {
      String id = String.valueOf(i);
      double time = Math.pow(10, 0.5 + 2.5 * random.nextDouble());
      switch (random.nextInt(4)) {
        case 0, 1 -> {
          pressure += (10 + 120 * random.nextDouble()) * BAR;
          steps.add(
              new Step.Fill(
                  id,
                  "v",
                  new Supply(
                      "s",
                      Interval.exactly(500 * BAR),
                      Interval.exactly(265 + 50 * random.nextDouble())),
                  new Drive.PressureRamp(Interval.exactly(pressure), time),
                  random.nextBoolean() ? OptionalDouble.of(0.006) : OptionalDouble.empty()));
        }
        case 2 -> {
          pressure = Math.max(0.45 * pressure, 2 * BAR);
          steps.add(
              new Step.Vent(id, "v", new Drive.PressureRamp(Interval.exactly(pressure), time)));
        }
        default -> steps.add(new Step.Hold(id, "v", time));
      }
    }
    return new Procedure(
        new Site(Interval.exactly(ambient), Interval.exactly(101325)), List.of(vessel), steps);
  }

  private static Wall wall(Random random) {
    Material steel =
        new Material(
            "steel", 7850, List.of(new Material.Point(293, 45, 470)), "invented for a test");
    Material plastic =
        new Material(
            "plastic", 950, List.of(new Material.Point(293, 0.4, 2000)), "invented for a test");
    List<Layer> layers = new ArrayList<>();
    if (random.nextInt(3) == 0) {
      layers.add(new Layer(plastic, Interval.exactly(0.004)));
    }
    layers.add(new Layer(steel, Interval.exactly(0.004 + 0.008 * random.nextDouble())));
    InsideFilm inside =
        random.nextBoolean()
            ? new InsideFilm.Correlation()
            : new InsideFilm.Given(Interval.exactly(Math.pow(10, 1 + 2 * random.nextDouble())));
    OutsideFilm outside =
        random.nextBoolean() ? new OutsideFilm.StillAir() : new OutsideFilm.WaterBath();
    return new Wall(
        new WallShape.Cylinder(0.23, 1.2, random.nextBoolean()), layers, inside, outside);
  }
}
