package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import org.gasmargin.process.Event;
import org.gasmargin.process.StepResult;
import org.gasmargin.worksheet.layout.Flow;
import org.gasmargin.worksheet.layout.Paragraph;
import org.gasmargin.worksheet.layout.Run;
import org.gasmargin.worksheet.layout.Style;
import org.gasmargin.worksheet.numbers.Durations;

/** The results, step by step: paths, plots, extremes, events and notes. */
final class StepsPart {
  private final WorksheetContent content;
  private final StepWords words;
  private final PathTable paths;
  private final EnvelopeTable envelopes;
  private final StepPlots plots;

  StepsPart(WorksheetContent content) {
    this.content = content;
    this.words = new StepWords(content);
    this.paths = new PathTable(content.units());
    this.envelopes = new EnvelopeTable(content);
    this.plots = new StepPlots(content);
  }

  void write(Flow flow) {
    flow.section("Results by step");
    flow.add(new PathKey());
    flow.add(
        Paragraph.of(
                "Adiabatic: no heat exchange, hottest supply. Isothermal: gas stays at the wall's"
                    + " first temperature. Unmixed: gas pushed ahead by the incoming gas. Thin"
                    + " lines in p–v, v = V/m: ideal gas from the start of the step, dashed at"
                    + " constant temperature (pv constant), solid without heat exchange (pvᵞ"
                    + " constant).",
                Style.SMALL)
            .keptWithNext());
    for (StepResult result : content.result().steps()) {
      flow.gap(8);
      flow.add(Paragraph.subsection(words.title(result.step())));
      flow.gap(2);
      flow.add(paths.of(result));
      flow.gap(5);
      plots.of(result).forEach(flow::add);
      flow.gap(3);
      flow.add(envelopes.of(result));
      flow.gap(3);
      for (Run note : notes(result)) {
        flow.add(Paragraph.of(note));
      }
    }
  }

  private static List<Run> notes(StepResult result) {
    List<Run> notes = new ArrayList<>();
    for (Event event : result.events()) {
      String letter = PathLook.of(event.path()).letter();
      notes.add(
          new Run(
              "After "
                  + Durations.text(event.time())
                  + " on path "
                  + letter
                  + ": "
                  + Prose.sentence(event.what()),
              Style.TABLE));
    }
    result.notes().forEach(note -> notes.add(new Run(Prose.sentence(note), Style.TABLE)));
    result
        .envelope()
        .failures()
        .forEach(
            failure ->
                notes.add(
                    new Run("Extreme unknown: " + Prose.sentence(failure), Style.TABLE.strong())));
    result
        .modelledCheckFailure()
        .ifPresent(
            failure ->
                notes.add(
                    new Run(
                        "The modelled path contradicts the bounds: " + Prose.sentence(failure),
                        Style.TABLE.strong())));
    return notes;
  }
}
