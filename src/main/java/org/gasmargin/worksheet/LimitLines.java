package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.gasmargin.rules.Limit;
import org.gasmargin.rules.LimitKind;
import org.gasmargin.units.Dimension;
import org.gasmargin.worksheet.numbers.Digits;
import org.gasmargin.worksheet.numbers.Scale;
import org.gasmargin.worksheet.plot.Plot;

/** The user's limits as lines in a plot, where they lie near enough to the curves. */
final class LimitLines {
  private static final double NEAR = 0.7;

  private static final Map<LimitKind, String> NAMES =
      Map.of(
          LimitKind.MAX_GAS_TEMPERATURE, "max. gas",
          LimitKind.MIN_GAS_TEMPERATURE, "min. gas",
          LimitKind.MAX_METAL_TEMPERATURE, "max. metal",
          LimitKind.MIN_METAL_TEMPERATURE, "min. metal",
          LimitKind.IGNITION_TEMPERATURE, "ignition",
          LimitKind.MAX_PRESSURE, "max.",
          LimitKind.MIN_PRESSURE, "min.",
          LimitKind.TEST_PRESSURE, "test",
          LimitKind.WORKING_PRESSURE, "working");

  private LimitLines() {}

  /**
   * The lines for an axis; limits at the same value share one.
   *
   * @param limits of the vessel
   * @param dimension of the axis
   * @param scale of the axis
   * @param least least value of the curves, as shown
   * @param most largest value of the curves, as shown
   */
  static List<Plot.LimitLine> of(
      List<Limit> limits, Dimension dimension, Scale scale, double least, double most) {
    double range = Math.max(most - least, 1e-3 * Math.abs(most));
    Map<String, List<String>> names = new LinkedHashMap<>();
    Map<String, Double> values = new LinkedHashMap<>();
    for (Limit limit : limits) {
      String name = NAMES.get(limit.kind());
      double shown = scale.shown(limit.value().si().nominal());
      boolean near = shown > least - NEAR * range && shown < most + NEAR * range;
      if (name != null && limit.kind().dimension() == dimension && near) {
        String number = Digits.trimmed(shown);
        names.computeIfAbsent(number, n -> new ArrayList<>()).add(name);
        values.put(number, shown);
      }
    }
    List<Plot.LimitLine> lines = new ArrayList<>();
    values.forEach(
        (number, value) ->
            lines.add(
                new Plot.LimitLine(
                    value,
                    String.join(", ", names.getOrDefault(number, List.of())) + " " + number)));
    return lines;
  }
}
