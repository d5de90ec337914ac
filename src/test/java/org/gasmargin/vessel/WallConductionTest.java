package org.gasmargin.vessel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.gasmargin.units.Interval;
import org.junit.jupiter.api.Test;

/** Geometry, steady conduction and heat content. Closed forms are textbook results. */
class WallConductionTest {
  private static final double[] THICKNESSES = {0.005, 0.020};

  private static Wall wall(WallShape shape, Material inner, Material outer) {
    return new Wall(
        shape,
        List.of(
            new Layer(inner, Interval.exactly(THICKNESSES[0])),
            new Layer(outer, Interval.exactly(THICKNESSES[1]))),
        new InsideFilm.Correlation(),
        new OutsideFilm.StillAir());
  }

  private static Material constant(double density, double conductivity, double heatCapacity) {
    return new Material(
        "user material",
        density,
        List.of(new Material.Point(293.15, conductivity, heatCapacity)),
        "test");
  }

  private static final Material LINER = constant(950, 0.4, 2250);
  private static final Material COMPOSITE = constant(1550, 0.7, 1000);

  private static WallConduction of(WallShape shape) {
    return new WallConduction(wall(shape, LINER, COMPOSITE), THICKNESSES);
  }

  /** Series of all resistances from the inner to the outer surface, K/W. */
  private static double resistance(WallConduction wall) {
    double sum = 1 / wall.innerSurface(293.15).value() + 1 / wall.outerSurface(293.15).value();
    for (int i = 0; i + 1 < wall.cells(); i++) {
      sum += 1 / wall.link(i, 293.15, 0, 0).byInner();
    }
    return sum;
  }

  @Test
  void steadyResistanceOfTwoRadialLayersIsTheSumOfLogarithms() {
    double radius = 0.1365;
    double length = 1e6; // so long that the ends do not count
    WallConduction wall = of(new WallShape.Cylinder(2 * radius, length, true));
    double middle = radius + THICKNESSES[0];
    double outer = middle + THICKNESSES[1];
    double expected =
        (Math.log(middle / radius) / 0.4 + Math.log(outer / middle) / 0.7) / (2 * Math.PI * length);
    assertEquals(expected, resistance(wall), 1e-6 * expected);
  }

  @Test
  void steadyResistanceOfASphereIsTheDifferenceOfReciprocalRadii() {
    double radius = 0.2;
    double middle = radius + THICKNESSES[0];
    double outer = middle + THICKNESSES[1];
    double expected =
        ((1 / radius - 1 / middle) / 0.4 + (1 / middle - 1 / outer) / 0.7) / (4 * Math.PI);
    assertEquals(expected, resistance(of(new WallShape.Sphere(2 * radius))), 1e-12 * expected);
  }

  @Test
  void steadyResistanceOfAPlateIsThicknessOverConductivityAndArea() {
    double expected = (THICKNESSES[0] / 0.4 + THICKNESSES[1] / 0.7) / 0.9;
    assertEquals(expected, resistance(of(new WallShape.Plate(0.9))), 1e-12 * expected);
  }

  @Test
  void endsOfACylinderCountAsFlatSlabsOfItsCrossSection() {
    double diameter = 0.229;
    double length = 1.4;
    WallConduction wall = of(new WallShape.Cylinder(diameter, length, false));
    double ends = 2 * Math.PI / 4 * diameter * diameter;
    assertEquals(Math.PI * diameter * length + ends, wall.innerArea(), 1e-12);
    assertEquals(Math.PI * (diameter + 0.05) * length + ends, wall.outerArea(), 1e-12);
  }

  @Test
  void massOfTheWallIsThatOfItsVolume() {
    double radius = 0.2;
    double middle = radius + THICKNESSES[0];
    double outer = middle + THICKNESSES[1];
    WallConduction sphere = of(new WallShape.Sphere(2 * radius));
    double shell = 4 * Math.PI / 3;
    double expected =
        shell * (Math.pow(middle, 3) - Math.pow(radius, 3)) * 950 * 2250
            + shell * (Math.pow(outer, 3) - Math.pow(middle, 3)) * 1550 * 1000;
    double[] warm = new double[sphere.cells()];
    Arrays.fill(warm, 294.15);
    assertEquals(expected, sphere.heatContentAbove(293.15, warm), 1e-9 * expected);
  }

  @Test
  void heatContentIsTheIntegralOfAHeatCapacityThatDependsOnTemperature() {
    Material steel =
        new Material(
            "user material",
            7900,
            List.of(
                new Material.Point(200, 12.6, 402),
                new Material.Point(300, 14.9, 477),
                new Material.Point(400, 16.6, 515)),
            "test");
    WallConduction wall =
        new WallConduction(wall(new WallShape.Plate(1), steel, steel), THICKNESSES);
    double[] hot = new double[wall.cells()];
    Arrays.fill(hot, 450);
    double mass = 0.025 * 7900;
    double integral = 100 * (402 + 477) / 2.0 + 100 * (477 + 515) / 2.0 + 50 * 515 + 50 * 402;
    assertEquals(mass * integral, wall.heatContentAbove(150, hot), 1e-9 * mass * integral);
    assertEquals(450, wall.meanTemperature(hot), 1e-10);
    hot[0] = 250;
    double mean = wall.meanTemperature(hot);
    double[] uniform = new double[wall.cells()];
    Arrays.fill(uniform, mean);
    assertEquals(wall.heatContentAbove(300, hot), wall.heatContentAbove(300, uniform), 1e-6);
  }

  @Test
  void slopesOfAConductanceThatDependsOnTemperatureAreItsDerivatives() {
    Material bent =
        new Material(
            "user material",
            7900,
            List.of(new Material.Point(200, 10, 400), new Material.Point(400, 20, 500)),
            "test");
    WallConduction wall =
        new WallConduction(wall(new WallShape.Plate(1), bent, LINER), THICKNESSES);
    double nudge = 1e-3;
    WallConduction.Link link = wall.link(3, 250, 50, 0);
    double byInner =
        (wall.link(3, 250, 50 + nudge, 0).heat() - wall.link(3, 250, 50 - nudge, 0).heat())
            / (2 * nudge);
    double byOuter =
        (wall.link(3, 250, 50, nudge).heat() - wall.link(3, 250, 50, -nudge).heat()) / (2 * nudge);
    assertEquals(byInner, link.byInner(), 1e-6 * Math.abs(byInner));
    assertEquals(byOuter, link.byOuter(), 1e-6 * Math.abs(byOuter));
  }

  @Test
  void firstCellOfAPlasticLinerIsFinerThanATenthOfAMillimetre() {
    WallConduction wall = of(new WallShape.Plate(1));
    double halfCell = 0.4 / wall.innerSurface(293.15).value();
    assertTrue(2 * halfCell < 1e-4, "first cell is " + 2 * halfCell + " m");
  }

  @Test
  void layerWithoutThicknessIsRefused() {
    Wall wall = wall(new WallShape.Plate(1), LINER, COMPOSITE);
    assertThrows(
        IllegalArgumentException.class,
        () -> new WallConduction(wall, new double[] {0.005, Double.NaN}));
  }
}
