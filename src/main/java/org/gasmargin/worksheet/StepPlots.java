package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.StepResult;
import org.gasmargin.rules.Limit;
import org.gasmargin.units.Dimension;
import org.gasmargin.worksheet.layout.Block;
import org.gasmargin.worksheet.layout.Columns;
import org.gasmargin.worksheet.layout.Figure;
import org.gasmargin.worksheet.numbers.Digits;
import org.gasmargin.worksheet.numbers.Durations;
import org.gasmargin.worksheet.numbers.Scale;
import org.gasmargin.worksheet.plot.Axis;
import org.gasmargin.worksheet.plot.Curve;
import org.gasmargin.worksheet.plot.Plot;

/**
 * Pressure and temperature of one step against time, and pressure against specific volume. A step
 * that takes no time has its temperature against its pressure instead.
 */
final class StepPlots {
  private static final float HEIGHT = 106;
  private static final int PLACES = 3;

  private final WorksheetContent content;
  private final Quantity temperature;
  private final Quantity pressure;

  StepPlots(WorksheetContent content) {
    this.content = content;
    temperature =
        new Quantity(
            "Gas temperature",
            "T",
            Dimension.TEMPERATURE,
            Scale.of(Dimension.TEMPERATURE, content.units()),
            PathPoint::temperature);
    pressure =
        new Quantity(
            "Pressure",
            "p",
            Dimension.ABSOLUTE_PRESSURE,
            Scale.of(Dimension.ABSOLUTE_PRESSURE, content.units()),
            PathPoint::pressure);
  }

  private record Quantity(
      String name,
      String symbol,
      Dimension dimension,
      Scale scale,
      ToDoubleFunction<PathPoint> value) {
    double shown(PathPoint point) {
      return scale.shown(value.applyAsDouble(point));
    }

    String title() {
      return symbol + " / " + scale.symbol();
    }
  }

  private record Drawn(PathLook look, Path path) {}

  /** The plots side by side; none if no path was computed. */
  List<Block> of(StepResult result) {
    List<Drawn> drawn = new ArrayList<>();
    for (PathLook look : PathLook.ALL) {
      result.path(look.kind()).ifPresent(path -> drawn.add(new Drawn(look, path)));
    }
    if (drawn.isEmpty()) {
      return List.of();
    }
    drawn.sort(Comparator.comparingDouble(one -> -one.look().stroke().width()));
    List<Block> plots = new ArrayList<>();
    double longest = drawn.stream().mapToDouble(one -> one.path().duration()).max().orElseThrow();
    if (longest > 0) {
      Quantity time =
          new Quantity("time", "t", Dimension.TIME, Durations.scaleFor(longest), PathPoint::time);
      figure(result, drawn, time, pressure).ifPresent(plots::add);
      figure(result, drawn, time, temperature).ifPresent(plots::add);
    } else {
      figure(result, drawn, pressure, temperature).ifPresent(plots::add);
    }
    new VolumePlot(content, result, pressure.scale()).figure(HEIGHT).ifPresent(plots::add);
    List<List<Block>> columns = new ArrayList<>();
    for (int i = 0; i < PLACES; i++) {
      columns.add(i < plots.size() ? List.of(plots.get(i)) : List.of());
    }
    return List.of(new Columns(columns, List.of(1 / 3f, 1 / 3f, 1 / 3f), 6));
  }

  private Optional<Figure> figure(
      StepResult result, List<Drawn> drawn, Quantity along, Quantity across) {
    List<Curve> curves = new ArrayList<>();
    double[] x = {Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY};
    double[] y = {Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY};
    StringBuilder told = new StringBuilder(across.name());
    told.append(" against ").append(along.name()).append(", step ").append(result.step().id());
    for (Drawn one : drawn) {
      List<Curve.Point> points = new ArrayList<>();
      for (PathPoint point : one.path().points()) {
        Curve.Point shown = new Curve.Point(along.shown(point), across.shown(point));
        if (Double.isFinite(shown.x()) && Double.isFinite(shown.y())) {
          points.add(shown);
          widen(x, shown.x());
          widen(y, shown.y());
        }
      }
      if (points.isEmpty()) {
        continue;
      }
      curves.add(new Curve(one.look().letter(), one.look().stroke(), points));
      told.append(tell(one.look(), points, along, across));
    }
    if (curves.isEmpty()) {
      return Optional.empty();
    }
    List<Limit> all = content.limits().getOrDefault(result.step().vessel(), List.of());
    List<Plot.LimitLine> limits =
        LimitLines.of(all, across.dimension(), across.scale(), y[0], y[1]);
    for (Plot.LimitLine limit : limits) {
      widen(y, limit.value());
      told.append("; limit ").append(limit.label());
    }
    Axis horizontal =
        along.dimension() == Dimension.TIME
            ? Axis.fromZero(x[1], along.title())
            : Axis.linear(x[0], x[1], along.title());
    Axis vertical = Axis.linear(y[0], y[1], across.title());
    Plot plot = new Plot(horizontal, vertical, curves, limits);
    return Optional.of(new Figure(HEIGHT, told.append('.').toString(), plot));
  }

  private static void widen(double[] range, double value) {
    range[0] = Math.min(range[0], value);
    range[1] = Math.max(range[1], value);
  }

  private static String tell(
      PathLook look, List<Curve.Point> points, Quantity along, Quantity across) {
    Curve.Point first = points.get(0);
    Curve.Point last = points.get(points.size() - 1);
    return "; "
        + look.words()
        + ": from "
        + Digits.of(first.y())
        + " to "
        + Digits.of(last.y())
        + " "
        + across.scale().symbol()
        + " at "
        + Digits.of(last.x())
        + " "
        + along.scale().symbol();
  }
}
