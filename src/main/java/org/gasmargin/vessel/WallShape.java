package org.gasmargin.vessel;

/** The geometry of a wall. */
public sealed interface WallShape {

  /**
   * A flat slab.
   *
   * @param area inner area, m2, the same at every depth
   */
  record Plate(double area) implements WallShape {}

  /**
   * A cylinder with radial conduction; the ends are added by their area.
   *
   * @param innerDiameter m
   * @param length inner length, m
   * @param lying whether the axis is horizontal
   */
  record Cylinder(double innerDiameter, double length, boolean lying) implements WallShape {}

  /**
   * A sphere with radial conduction.
   *
   * @param innerDiameter m
   */
  record Sphere(double innerDiameter) implements WallShape {}
}
