package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.worksheet.layout.Flow;
import org.gasmargin.worksheet.layout.Paragraph;
import org.gasmargin.worksheet.layout.Style;
import org.gasmargin.worksheet.layout.TickList;

/** What the numbers rest on and only a person can confirm. */
final class AssumptionsPart {
  private AssumptionsPart() {}

  static void write(Flow flow, WorksheetContent content) {
    flow.section("Assumptions to be confirmed by the reviewer");
    flow.add(
        Paragraph.of(
                "Tick each that was checked against the equipment. One that does not hold makes"
                    + " the numbers above void.",
                Style.SMALL)
            .keptWithNext());
    flow.gap(2);
    flow.add(new TickList(items(content), Style.TABLE));
  }

  private static List<String> items(WorksheetContent content) {
    List<String> items = new ArrayList<>();
    items.add("The inputs agree with the nameplate, the data sheet and the gauges of this job.");
    items.add("The gas is the one stated, dry, and stays a single phase: no liquid, no solid.");
    items.add("The vessel is rigid, sound and in date; its volume is the gas volume stated.");
    items.add("The steps are done in this order, with nothing in between.");
    if (any(content, Step.Fill.class)) {
      items.add(
          "The supply stays within its stated pressure and temperature for the whole fill; a hotter"
              + " supply makes a hotter vessel.");
      items.add(
          "Incoming gas mixes with the gas in the vessel. Where it cannot (narrow pipe, dead end),"
              + " the unmixed path counts.");
    }
    if (any(content, Step.Vent.class)) {
      items.add(
          "The vent is not opened further than stated; a larger opening leaves less time for the"
              + " wall to warm the gas.");
    }
    if (any(content, Step.Compress.class)) {
      items.add("The closed end is clean and holds nothing that the hot gas could ignite.");
    }
    if (content.judgement().judgedOn() == JudgeOn.MODELLED) {
      items.add(
          "The wall is as described and in contact with the gas: the verdict counts on the heat"
              + " that it takes up.");
    }
    return items;
  }

  private static boolean any(WorksheetContent content, Class<? extends Step> kind) {
    return content.result().steps().stream().map(StepResult::step).anyMatch(kind::isInstance);
  }
}
