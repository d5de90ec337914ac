package org.gasmargin.worksheet;

import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.io.Writer;
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

  /** The series as text. */
  public static String text(WorksheetContent content) {
    StringWriter text = new StringWriter();
    try {
      write(content, text);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return text.toString();
  }

  /** Writes the series and leaves the writer open. */
  public static void write(WorksheetContent content, Writer target) throws IOException {
    target.write(HEAD);
    for (StepResult step : content.result().steps()) {
      for (PathKind kind : PathKind.values()) {
        Optional<Path> path = step.path(kind);
        if (path.isPresent()) {
          String start =
              quoted(step.step().id()) + "," + kind.name().toLowerCase(Locale.ROOT) + ",";
          for (PathPoint point : path.get().points()) {
            target.write(start + numbers(point) + "\n");
          }
        }
      }
    }
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
