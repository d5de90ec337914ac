package org.gasmargin.worksheet;

import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.StepResult;

/**
 * The paths over time as comma-separated values in SI, with all digits of the numbers; what is
 * absent or not finite is an empty field.
 */
public final class SeriesCsv {
  private static final String HEAD =
      "step,path,t_s,p_Pa,T_gas_K,m_kg,T_wall_inner_K,T_wall_mean_K,mdot_kg_s\n";

  private SeriesCsv() {}

  /** The series of every path that was computed. */
  public static String text(WorksheetContent content) {
    StringBuilder text = new StringBuilder(HEAD);
    for (StepResult step : content.result().steps()) {
      for (PathKind kind : PathKind.values()) {
        Optional<Path> path = step.path(kind);
        if (path.isPresent()) {
          String start = quoted(step.step().id()) + "," + kind.name().toLowerCase(Locale.ROOT);
          for (PathPoint point : path.get().points()) {
            text.append(start).append(',').append(numbers(point)).append('\n');
          }
        }
      }
    }
    return text.toString();
  }

  private static String numbers(PathPoint point) {
    return String.join(
        ",",
        number(point.time()),
        number(point.pressure()),
        number(point.temperature()),
        number(point.mass()),
        number(point.innerWall()),
        number(point.meanWall()),
        number(point.massFlow()));
  }

  private static String number(OptionalDouble value) {
    return value.isPresent() ? number(value.getAsDouble()) : "";
  }

  private static String number(double value) {
    return Double.isFinite(value) ? Double.toString(value) : "";
  }

  /** A field in quotes if it holds anything that would break the line. */
  private static String quoted(String field) {
    return field.matches("[\\w .:()-]*") ? field : "\"" + field.replace("\"", "\"\"") + "\"";
  }
}
