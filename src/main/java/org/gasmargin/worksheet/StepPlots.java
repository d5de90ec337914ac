package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.StepResult;
import org.gasmargin.rules.Limit;
import org.gasmargin.rules.LimitKind;
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

/** Pressure and temperature of one step against time, and pressure against specific volume. */
final class StepPlots {
  private static final float HEIGHT = 112;

  private static final Map<LimitKind, String> TEMPERATURE_LIMITS =
      Map.of(
          LimitKind.MAX_GAS_TEMPERATURE, "max. gas",
          LimitKind.MIN_GAS_TEMPERATURE, "min. gas",
          LimitKind.MAX_METAL_TEMPERATURE, "max. metal",
          LimitKind.MIN_METAL_TEMPERATURE, "min. metal",
          LimitKind.IGNITION_TEMPERATURE, "ignition");

  private static final Map<LimitKind, String> PRESSURE_LIMITS =
      Map.of(
          LimitKind.MAX_PRESSURE, "max.",
          LimitKind.MIN_PRESSURE, "min.",
          LimitKind.TEST_PRESSURE, "test",
          LimitKind.WORKING_PRESSURE, "working");

  private final WorksheetContent content;
  private final Scale temperature;
  private final Scale pressure;

  StepPlots(WorksheetContent content) {
    this.content = content;
    temperature = Scale.of(Dimension.TEMPERATURE, content.units());
    pressure = Scale.of(Dimension.ABSOLUTE_PRESSURE, content.units());
  }

  /** The plots side by side; no columns if no path was computed. */
  List<Block> of(StepResult result) {
    List<PathLook> looks = new ArrayList<>();
    for (PathLook look : PathLook.ALL) {
      if (result.path(look.kind()).isPresent()) {
        looks.add(look);
      }
    }
    if (looks.isEmpty()) {
      return List.of();
    }
    List<Block> plots = new ArrayList<>();
    plots.add(
        overTime(result, looks, "Pressure", "p", pressure, PathPoint::pressure, PRESSURE_LIMITS));
    plots.add(
        overTime(
            result,
            looks,
            "Gas temperature",
            "T",
            temperature,
            PathPoint::temperature,
            TEMPERATURE_LIMITS));
    new VolumePlot(content, result, pressure).figure(HEIGHT).ifPresent(plots::add);
    List<List<Block>> columns = new ArrayList<>();
    for (int i = 0; i < 3; i++) {
      columns.add(i < plots.size() ? List.of(plots.get(i)) : List.of());
    }
    return List.of(new Columns(columns, List.of(1 / 3f, 1 / 3f, 1 / 3f), 6));
  }

  private Figure overTime(
      StepResult result,
      List<PathLook> looks,
      String name,
      String symbol,
      Scale scale,
      ToDoubleFunction<PathPoint> value,
      Map<LimitKind, String> limitNames) {
    List<Path> paths = looks.stream().map(look -> result.path(look.kind()).orElseThrow()).toList();
    Scale time = Durations.scaleFor(paths.stream().mapToDouble(Path::duration).max().orElseThrow());
    List<Curve> curves = new ArrayList<>();
    double least = Double.POSITIVE_INFINITY;
    double most = Double.NEGATIVE_INFINITY;
    double longest = 0;
    StringBuilder told = new StringBuilder(name + " against time, step " + result.step().id());
    for (int i = 0; i < paths.size(); i++) {
      List<Curve.Point> points = new ArrayList<>();
      for (PathPoint point : paths.get(i).points()) {
        double shown = scale.shown(value.applyAsDouble(point));
        points.add(new Curve.Point(time.shown(point.time()), shown));
        least = Math.min(least, shown);
        most = Math.max(most, shown);
        longest = Math.max(longest, time.shown(point.time()));
      }
      curves.add(new Curve(looks.get(i).letter(), looks.get(i).stroke(), points));
      told.append(tell(looks.get(i), points, time, scale));
    }
    curves.sort(Comparator.comparingDouble(curve -> -curve.stroke().width()));
    List<Plot.LimitLine> limits = new ArrayList<>();
    double range = Math.max(most - least, 1e-3 * Math.abs(most));
    for (Limit limit : limits(result)) {
      String limitName = limitNames.get(limit.kind());
      double shown = scale.shown(limit.value().si().nominal());
      if (limitName != null && shown > least - 0.7 * range && shown < most + 0.7 * range) {
        limits.add(new Plot.LimitLine(shown, limitName + " " + Digits.trimmed(shown)));
        told.append("; limit ").append(limitName).append(' ').append(Digits.trimmed(shown));
      }
    }
    for (Plot.LimitLine limit : limits) {
      least = Math.min(least, limit.value());
      most = Math.max(most, limit.value());
    }
    Axis x = Axis.fromZero(longest, "t / " + time.symbol());
    Axis y = Axis.linear(least, most, symbol + " / " + scale.symbol());
    return new Figure(HEIGHT, told.append('.').toString(), new Plot(x, y, curves, limits));
  }

  private List<Limit> limits(StepResult result) {
    return content.limits().getOrDefault(result.step().vessel(), List.of());
  }

  private static String tell(PathLook look, List<Curve.Point> points, Scale time, Scale scale) {
    Curve.Point first = points.get(0);
    Curve.Point last = points.get(points.size() - 1);
    return "; "
        + look.words()
        + ": from "
        + Digits.of(first.y())
        + " to "
        + Digits.of(last.y())
        + " "
        + scale.symbol()
        + " in "
        + Digits.of(last.x())
        + " "
        + time.symbol();
  }
}
