package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.worksheet.layout.Figure;
import org.gasmargin.worksheet.layout.Stroke;
import org.gasmargin.worksheet.numbers.Scale;
import org.gasmargin.worksheet.plot.Axis;
import org.gasmargin.worksheet.plot.Curve;
import org.gasmargin.worksheet.plot.Plot;

/**
 * Pressure against specific volume v = V/m, with the two ideal-gas reference curves through the
 * start: constant temperature (p v constant) and no heat exchange (p v^γ constant). The specific
 * volume is what changes when a rigid vessel is filled or vented.
 */
final class VolumePlot {
  private static final Stroke REFERENCE_ISOTHERM = new Stroke(0.5f, 0.35f, List.of(2f, 2f));
  private static final Stroke REFERENCE_ADIABAT = Stroke.solid(0.5f, 0.35f);
  private static final double LOGARITHMIC_FROM = 6;
  private static final int REFERENCE_POINTS = 60;

  private final StepResult result;
  private final Vessel vessel;
  private final Scale pressure;

  VolumePlot(WorksheetContent content, StepResult result, Scale gaugeOrAbsolute) {
    this.result = result;
    this.vessel = content.result().procedure().vesselOf(result.step());
    String symbol = gaugeOrAbsolute.symbol();
    this.pressure =
        new Scale(gaugeOrAbsolute.slope(), 0, symbol.endsWith("(g)") ? absolute(symbol) : symbol);
  }

  /** The plot, if a path was computed. */
  Optional<Figure> figure(float height) {
    List<Curve> curves = new ArrayList<>();
    for (PathLook look : PathLook.ALL) {
      result
          .path(look.kind())
          .map(path -> points(look.kind(), path))
          .filter(points -> points.size() > 1)
          .ifPresent(points -> curves.add(new Curve(look.letter(), look.stroke(), points)));
    }
    if (curves.isEmpty()) {
      return Optional.empty();
    }
    curves.sort(Comparator.comparingDouble(curve -> -curve.stroke().width()));
    double[] v = range(curves, true);
    double[] p = range(curves, false);
    boolean logarithmic = v[1] > LOGARITHMIC_FROM * v[0] || p[1] > LOGARITHMIC_FROM * p[0];
    Scale volume = new Scale(v[1] < 0.1 ? 1e3 : 1, 0, v[1] < 0.1 ? "L/kg" : "m³/kg");
    Axis x =
        axis(v[0] * volume.slope(), v[1] * volume.slope(), logarithmic, "v / " + volume.symbol());
    Axis y = axis(p[0], p[1], logarithmic, "p / " + pressure.symbol());
    List<Curve> drawn = new ArrayList<>();
    Curve.Point start = curves.get(curves.size() - 1).points().get(0);
    double gamma = gamma();
    drawn.add(reference("", REFERENCE_ISOTHERM, start, 1, v, volume));
    drawn.add(reference("", REFERENCE_ADIABAT, start, gamma, v, volume));
    for (Curve curve : curves) {
      drawn.add(
          new Curve(
              curve.label(),
              curve.stroke(),
              curve.points().stream()
                  .map(point -> new Curve.Point(volume.shown(point.x()), point.y()))
                  .toList()));
    }
    return Optional.of(
        new Figure(
            height,
            "Pressure against specific volume, step "
                + result.step().id()
                + ", with the ideal-gas curves of constant temperature and of no heat exchange"
                + " through the start.",
            new Plot(x, y, drawn, List.of())));
  }

  private double gamma() {
    double cp = vessel.gas().idealCp(vessel.startTemperature().nominal());
    return cp / (cp - Gas.MOLAR_GAS_CONSTANT);
  }

  private List<Curve.Point> points(PathKind kind, Path path) {
    boolean ofItself = kind == PathKind.UNMIXED || result.step() instanceof Step.Compress;
    List<Curve.Point> points = new ArrayList<>();
    for (PathPoint point : path.points()) {
      double volume = ofItself ? ofTrappedGas(point) : vessel.volume().nominal() / point.mass();
      double shown = pressure.shown(point.pressure());
      if (Double.isFinite(volume) && volume > 0 && shown > 0) {
        points.add(new Curve.Point(volume, shown));
      }
    }
    return points;
  }

  /** Gas that does not mix has a density of its own; NaN where the equation of state ends. */
  private double ofTrappedGas(PathPoint point) {
    try {
      double density =
          vessel.gas().atTemperaturePressure(point.temperature(), point.pressure()).molarDensity();
      return 1 / (density * vessel.gas().molarMass());
    } catch (OutsideValidity beyond) {
      return Double.NaN;
    }
  }

  private static Curve reference(
      String label, Stroke stroke, Curve.Point start, double exponent, double[] v, Scale volume) {
    double from = v[0] * 0.5;
    double ratio = v[1] * 2 / from;
    List<Curve.Point> points = new ArrayList<>();
    for (int i = 0; i <= REFERENCE_POINTS; i++) {
      double at = from * Math.pow(ratio, (double) i / REFERENCE_POINTS);
      double p = start.y() * Math.pow(start.x() / at, exponent);
      points.add(new Curve.Point(volume.shown(at), p));
    }
    return new Curve(label, stroke, points);
  }

  private static Axis axis(double least, double most, boolean logarithmic, String title) {
    return logarithmic ? Axis.logarithmic(least, most, title) : Axis.linear(least, most, title);
  }

  private static double[] range(List<Curve> curves, boolean horizontal) {
    double least = Double.POSITIVE_INFINITY;
    double most = Double.NEGATIVE_INFINITY;
    for (Curve curve : curves) {
      for (Curve.Point point : curve.points()) {
        double value = horizontal ? point.x() : point.y();
        least = Math.min(least, value);
        most = Math.max(most, value);
      }
    }
    return new double[] {least, most};
  }

  private static String absolute(String symbol) {
    return symbol.replace("(g)", "(a)");
  }
}
