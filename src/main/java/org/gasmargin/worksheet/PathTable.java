package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.StepResult;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.worksheet.layout.Cell;
import org.gasmargin.worksheet.layout.Sheet;
import org.gasmargin.worksheet.layout.Table;
import org.gasmargin.worksheet.numbers.Digits;
import org.gasmargin.worksheet.numbers.Durations;
import org.gasmargin.worksheet.numbers.Scale;
import org.jspecify.annotations.Nullable;

/** The ways through one step as a table, one row a path. */
final class PathTable {
  private static final int NUMBERS = 9;
  private static final float NAME_WIDTH = 76;

  private final Scale temperature;
  private final Scale pressure;
  private final Scale mass;
  private final boolean massChosen;

  PathTable(DisplayUnits units) {
    temperature = Scale.of(Dimension.TEMPERATURE, units);
    pressure = Scale.of(Dimension.ABSOLUTE_PRESSURE, units);
    mass = Scale.of(Dimension.MASS, units);
    massChosen = units.units().containsKey(Dimension.MASS);
  }

  Table of(StepResult result) {
    List<Path> paths = new ArrayList<>();
    for (PathLook look : PathLook.ALL) {
      result.path(look.kind()).ifPresent(paths::add);
    }
    double longest = paths.stream().mapToDouble(Path::duration).max().orElse(1);
    Scale time = Durations.scaleFor(longest);
    Scale masses = massScale(paths);
    List<Quantity> quantities =
        List.of(
            degrees(paths, Path::peakGasTemperature),
            degrees(paths, Path::lowestGasTemperature),
            degrees(paths, path -> path.last().temperature()),
            fixed(paths, pressure, Path::peakPressure),
            fixed(paths, pressure, path -> path.last().pressure()),
            fixed(paths, masses, path -> path.last().mass()),
            new Quantity(temperature, 1, Path::peakWallTemperature),
            new Quantity(temperature, 1, Path::lowestWallTemperature),
            durations(paths, time));
    List<Table.Row> rows = new ArrayList<>();
    for (PathLook look : PathLook.ALL) {
      PathOutcome outcome = result.paths().get(look.kind());
      boolean foreign = look.kind() == PathKind.UNMIXED && outcome instanceof PathOutcome.Absent;
      if (!foreign) {
        rows.add(row(look, outcome, quantities));
      }
    }
    return new Table(columns(masses, time), rows);
  }

  private List<Table.Column> columns(Scale masses, Scale time) {
    String degrees = "\n" + temperature.symbol();
    List<String> heads =
        List.of(
            "max. gas" + degrees,
            "min. gas" + degrees,
            "end gas" + degrees,
            "max. p\n" + pressure.symbol(),
            "end p\n" + pressure.symbol(),
            "end mass\n" + masses.symbol(),
            "max. wall" + degrees,
            "min. wall" + degrees,
            "duration\n" + time.symbol());
    List<Table.Column> columns = new ArrayList<>();
    columns.add(Table.Column.text("Path").wide(NAME_WIDTH));
    float width = (Sheet.CONTENT_WIDTH - NAME_WIDTH) / NUMBERS;
    heads.forEach(head -> columns.add(Table.Column.numbers(head).wide(width)));
    return columns;
  }

  private static Table.Row row(
      PathLook look, @Nullable PathOutcome outcome, List<Quantity> quantities) {
    List<Cell> cells = new ArrayList<>();
    cells.add(Cell.name(look.letter() + "  " + look.words()));
    if (outcome instanceof PathOutcome.Computed computed) {
      quantities.forEach(quantity -> cells.add(Cell.of(quantity.text(computed.path()))));
    } else {
      cells.add(Cell.of(reason(outcome)).across(NUMBERS));
    }
    return new Table.Row(cells, false);
  }

  private static String reason(@Nullable PathOutcome outcome) {
    if (outcome instanceof PathOutcome.Failed failed) {
      return "NOT COMPUTED: " + Prose.sentence(failed.reason());
    }
    return outcome instanceof PathOutcome.Absent absent
        ? "none: " + Prose.tidy(absent.reason())
        : "NOT COMPUTED.";
  }

  private Quantity degrees(List<Path> paths, ToDoubleFunction<Path> value) {
    double largest = largest(paths, temperature, value);
    return new Quantity(
        temperature, largest < 1e5 ? 1 : 0, path -> OptionalDouble.of(value.applyAsDouble(path)));
  }

  private static Quantity fixed(List<Path> paths, Scale scale, ToDoubleFunction<Path> value) {
    return new Quantity(
        scale,
        Digits.decimalsFor(largest(paths, scale, value)),
        path -> OptionalDouble.of(value.applyAsDouble(path)));
  }

  private static Quantity durations(List<Path> paths, Scale scale) {
    double[] shown = paths.stream().mapToDouble(path -> scale.shown(path.duration())).toArray();
    return new Quantity(
        scale, Digits.fewestDecimals(shown), path -> OptionalDouble.of(path.duration()));
  }

  /** Small amounts are shown in g or mg unless the user has a unit of mass. */
  private Scale massScale(List<Path> paths) {
    double largest = largest(paths, mass, path -> path.last().mass());
    if (massChosen || largest >= 0.01) {
      return mass;
    }
    return largest >= 1e-4 ? new Scale(1e3, 0, "g") : new Scale(1e6, 0, "mg");
  }

  private static double largest(List<Path> paths, Scale scale, ToDoubleFunction<Path> value) {
    return paths.stream()
        .mapToDouble(path -> Math.abs(scale.shown(value.applyAsDouble(path))))
        .max()
        .orElse(0);
  }

  private record Quantity(Scale scale, int decimals, Function<Path, OptionalDouble> value) {
    String text(Path path) {
      OptionalDouble si = value.apply(path);
      return si.isPresent() ? Digits.of(scale.shown(si.getAsDouble()), decimals) : "–";
    }
  }
}
