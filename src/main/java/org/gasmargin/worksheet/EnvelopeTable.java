package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.process.StepResult.Credited;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.units.Dimension;
import org.gasmargin.worksheet.layout.Cell;
import org.gasmargin.worksheet.layout.Table;
import org.gasmargin.worksheet.numbers.Digits;
import org.gasmargin.worksheet.numbers.Scale;

/**
 * The extremes of a step, each with the path that leads to it, and beside them what the modelled
 * path gives with its uncertainty, if the job judges on that.
 */
final class EnvelopeTable {
  private static final float NAME_WIDTH = 118;
  private static final float VALUE_WIDTH = 70;

  private final Scale temperature;
  private final Scale pressure;
  private final boolean credits;

  EnvelopeTable(WorksheetContent content) {
    temperature = Scale.of(Dimension.TEMPERATURE, content.units());
    pressure = Scale.of(Dimension.ABSOLUTE_PRESSURE, content.units());
    credits = content.judgement().judgedOn() == JudgeOn.MODELLED;
  }

  Table of(StepResult result) {
    Envelope envelope = result.envelope();
    Optional<Credited> credited = result.credited();
    List<Table.Row> rows = new ArrayList<>();
    rows.add(
        row(
            "highest gas temperature",
            envelope.highestGasTemperature(),
            credited.map(Credited::highestGasTemperature),
            temperature));
    rows.add(
        row(
            "lowest gas temperature",
            envelope.lowestGasTemperature(),
            credited.map(Credited::lowestGasTemperature),
            temperature));
    rows.add(
        row(
            "highest pressure",
            envelope.highestPressure(),
            credited.map(Credited::highestPressure),
            pressure));
    rows.add(
        row(
            "lowest pressure",
            envelope.lowestPressure(),
            credited.map(Credited::lowestPressure),
            pressure));
    if (result.step() instanceof Step.Fill || result.step() instanceof Step.Compress) {
      Optional<Extreme> unmixed = envelope.highestUnmixedTemperature();
      rows.add(row("hottest unmixed gas", unmixed, Optional.empty(), temperature));
    }
    if (credits) {
      credited.ifPresent(c -> rows.addAll(walls(c)));
    }
    return new Table(columns(), rows);
  }

  private List<Table.Column> columns() {
    List<Table.Column> columns = new ArrayList<>();
    columns.add(Table.Column.text("Extreme over all starts").wide(NAME_WIDTH));
    columns.add(Table.Column.numbers(credits ? "Bound" : "Value").wide(VALUE_WIDTH));
    if (credits) {
      columns.add(Table.Column.numbers("Credited").wide(VALUE_WIDTH));
    }
    columns.add(
        Table.Column.text(credits ? "Path that leads to the bound" : "Path that leads there"));
    return columns;
  }

  private Table.Row row(
      String name, Optional<Extreme> extreme, Optional<Double> credited, Scale scale) {
    List<Cell> cells = new ArrayList<>();
    cells.add(Cell.name(name));
    cells.add(Cell.of(extreme.map(e -> value(e.value(), scale)).orElse("unknown")));
    if (credits) {
      cells.add(Cell.of(credited.map(value -> value(value, scale)).orElse("–")));
    }
    cells.add(
        Cell.of(
            extreme
                .map(e -> Prose.tidy(e.path()))
                .orElse("a path that could set it left the range of the model")));
    return new Table.Row(cells, false);
  }

  /** Walls have no bound of their own: the gas and the surroundings bound them. */
  private List<Table.Row> walls(Credited credited) {
    List<Table.Row> rows = new ArrayList<>();
    wall("highest wall temperature", credited.highestWallTemperature(), rows);
    wall("lowest wall temperature", credited.lowestWallTemperature(), rows);
    return rows;
  }

  private void wall(String name, OptionalDouble value, List<Table.Row> rows) {
    if (value.isPresent()) {
      rows.add(
          Table.Row.of(
              Cell.name(name),
              Cell.of("–"),
              Cell.of(value(value.getAsDouble(), temperature)),
              Cell.of("bounded by the gas and the surroundings")));
    }
  }

  private String value(double si, Scale scale) {
    double shown = scale.shown(si);
    return scale.text(si, scale.equals(temperature) ? 1 : Digits.decimalsFor(shown));
  }
}
