package org.gasmargin.vessel;

/**
 * How the area that heat crosses grows with the depth x into the wall, counted from the inner
 * surface.
 *
 * <p>A plate has the same area at every depth. A cylinder is its shell, 2 pi (d/2 + x) L, and two
 * flat ends of the inner cross-section, pi d2/4 each, which keep their area with depth. A sphere
 * has 4 pi (d/2 + x)2.
 */
final class WallGeometry {
  private final WallShape shape;

  WallGeometry(WallShape shape) {
    this.shape = shape;
  }

  /** Area at a depth, m2. */
  double area(double depth) {
    if (shape instanceof WallShape.Sphere sphere) {
      double radius = sphere.innerDiameter() / 2 + depth;
      return 4 * Math.PI * radius * radius;
    }
    return areaAtSurface() + areaGrowth() * depth;
  }

  /** Volume of wall between two depths, m3. */
  double volume(double from, double to) {
    if (shape instanceof WallShape.Sphere sphere) {
      double inner = sphere.innerDiameter() / 2 + from;
      double outer = sphere.innerDiameter() / 2 + to;
      return 4 * Math.PI / 3 * (to - from) * (inner * inner + inner * outer + outer * outer);
    }
    return (to - from) * (areaAtSurface() + areaGrowth() * 0.5 * (from + to));
  }

  /** The integral of dx/area between two depths, 1/m: steady resistance times conductivity. */
  double resistance(double from, double to) {
    if (shape instanceof WallShape.Sphere sphere) {
      double inner = sphere.innerDiameter() / 2 + from;
      double outer = sphere.innerDiameter() / 2 + to;
      return (to - from) / (4 * Math.PI * inner * outer);
    }
    double growth = areaGrowth();
    double start = area(from);
    return growth == 0 ? (to - from) / start : Math.log1p(growth * (to - from) / start) / growth;
  }

  private double areaAtSurface() {
    if (shape instanceof WallShape.Cylinder cylinder) {
      double diameter = cylinder.innerDiameter();
      return Math.PI * diameter * (cylinder.length() + diameter / 2);
    }
    if (shape instanceof WallShape.Plate plate) {
      return plate.area();
    }
    throw new IllegalStateException("area of a sphere is not linear in depth");
  }

  private double areaGrowth() {
    return shape instanceof WallShape.Cylinder cylinder ? 2 * Math.PI * cylinder.length() : 0;
  }
}
