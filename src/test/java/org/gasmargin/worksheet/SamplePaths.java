package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;

/** Paths of an ideal gas in a rigid vessel, from the closed forms, for pages only. */
record SamplePaths(ConstantCpGas gas, double volume) {
  private static final int POINTS = 40;

  double gamma() {
    return gas.cpOverR() / (gas.cpOverR() - 1);
  }

  /** Temperature of an adiabatic charge from a main at {@code supply}, K. */
  DoubleUnaryOperator charge(double p1, double t1, double supply) {
    return p -> gamma() * supply / (1 + p1 / p * (gamma() * supply / t1 - 1));
  }

  /** Temperature along the isentrope, K. */
  DoubleUnaryOperator isentrope(double p1, double t1) {
    return p -> t1 * Math.pow(p / p1, (gamma() - 1) / gamma());
  }

  /** Temperature between two paths, nearer to the second by {@code share}, K. */
  static DoubleUnaryOperator between(
      DoubleUnaryOperator first, DoubleUnaryOperator second, double share) {
    return p -> first.applyAsDouble(p) * (1 - share) + second.applyAsDouble(p) * share;
  }

  /** A path along which the pressure runs in equal steps of time. */
  Path ramp(double p1, double p2, double duration, DoubleUnaryOperator temperature) {
    return path(p1, p2, duration, temperature, OptionalDouble.empty(), 0);
  }

  /** The same with a wall that moves from its start by {@code rise} K. */
  Path rampWithWall(
      double p1,
      double p2,
      double duration,
      DoubleUnaryOperator temperature,
      double wall,
      double rise) {
    return path(p1, p2, duration, temperature, OptionalDouble.of(wall), rise);
  }

  /** Gas that settles at constant volume. */
  Path settle(double p1, double t1, double t2, double duration, double wall) {
    List<PathPoint> points = new ArrayList<>();
    for (int i = 0; i <= POINTS; i++) {
      double time = duration * i / POINTS;
      double t = t2 + (t1 - t2) * Math.exp(-6 * time / duration);
      double w = wall + (t1 - wall) * 0.05 * Math.exp(-3 * time / duration);
      points.add(
          new PathPoint(
              time,
              p1 * t / t1,
              t,
              mass(p1, t1),
              0,
              OptionalDouble.of(w),
              OptionalDouble.of(w - 0.2)));
    }
    return of(points, OptionalDouble.of(wall + (t1 - wall) * 0.05), OptionalDouble.of(wall));
  }

  double mass(double pressure, double temperature) {
    return gas.atTemperaturePressure(temperature, pressure).molarDensity()
        * gas.molarMass()
        * volume;
  }

  private Path path(
      double p1,
      double p2,
      double duration,
      DoubleUnaryOperator temperature,
      OptionalDouble wall,
      double rise) {
    List<PathPoint> points = new ArrayList<>();
    for (int i = 0; i <= POINTS; i++) {
      double part = (double) i / POINTS;
      double p = p1 + (p2 - p1) * part;
      double t = temperature.applyAsDouble(p);
      OptionalDouble w =
          wall.isPresent()
              ? OptionalDouble.of(wall.getAsDouble() + rise * part)
              : OptionalDouble.empty();
      points.add(new PathPoint(duration * part, p, t, mass(p, t), 0, w, w));
    }
    double w1 = wall.orElse(0);
    return of(
        points,
        wall.isPresent() ? OptionalDouble.of(Math.max(w1, w1 + rise)) : wall,
        wall.isPresent() ? OptionalDouble.of(Math.min(w1, w1 + rise)) : wall);
  }

  private static Path of(
      List<PathPoint> points, OptionalDouble peakWall, OptionalDouble lowestWall) {
    return new Path(
        points,
        points.stream().mapToDouble(PathPoint::temperature).max().orElseThrow(),
        points.stream().mapToDouble(PathPoint::temperature).min().orElseThrow(),
        points.stream().mapToDouble(PathPoint::pressure).max().orElseThrow(),
        points.stream().mapToDouble(PathPoint::pressure).min().orElseThrow(),
        peakWall,
        lowestWall);
  }
}
