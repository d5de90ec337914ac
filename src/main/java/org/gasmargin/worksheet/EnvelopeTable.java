package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.worksheet.layout.Cell;
import org.gasmargin.worksheet.layout.Table;
import org.gasmargin.worksheet.numbers.Digits;
import org.gasmargin.worksheet.numbers.Scale;

/** The extremes on which the rules judge, each with the path that leads to it. */
final class EnvelopeTable {
  private final Scale temperature;
  private final Scale pressure;

  EnvelopeTable(DisplayUnits units) {
    temperature = Scale.of(Dimension.TEMPERATURE, units);
    pressure = Scale.of(Dimension.ABSOLUTE_PRESSURE, units);
  }

  Table of(StepResult result) {
    Envelope envelope = result.envelope();
    List<Table.Row> rows = new ArrayList<>();
    rows.add(row("highest gas temperature", envelope.highestGasTemperature(), temperature));
    rows.add(row("lowest gas temperature", envelope.lowestGasTemperature(), temperature));
    rows.add(row("highest pressure", envelope.highestPressure(), pressure));
    rows.add(row("lowest pressure", envelope.lowestPressure(), pressure));
    if (result.step() instanceof Step.Fill || result.step() instanceof Step.Compress) {
      rows.add(row("hottest unmixed gas", envelope.highestUnmixedTemperature(), temperature));
    }
    return new Table(
        List.of(
            Table.Column.text("Extreme over all starts").wide(118),
            Table.Column.numbers("Value").wide(70),
            Table.Column.text("Path that leads there")),
        rows);
  }

  private Table.Row row(String name, Optional<Extreme> extreme, Scale scale) {
    return Table.Row.of(
        Cell.name(name),
        Cell.of(extreme.map(e -> value(e, scale)).orElse("unknown")),
        Cell.of(
            extreme
                .map(e -> Prose.tidy(e.path()))
                .orElse("a path that could set it left the range of the model")));
  }

  private String value(Extreme extreme, Scale scale) {
    double shown = scale.shown(extreme.value());
    return scale.text(extreme.value(), scale.equals(temperature) ? 1 : Digits.decimalsFor(shown));
  }
}
