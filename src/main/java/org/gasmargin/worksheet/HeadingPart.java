package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.List;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.worksheet.layout.Block;
import org.gasmargin.worksheet.layout.Columns;
import org.gasmargin.worksheet.layout.Flow;
import org.gasmargin.worksheet.layout.Gap;
import org.gasmargin.worksheet.layout.Paragraph;
import org.gasmargin.worksheet.layout.Run;
import org.gasmargin.worksheet.layout.Style;

/** The top of the first page: title, verdict, reason, what was judged on, cautions. */
final class HeadingPart {
  private final WorksheetContent content;
  private final Governing governing;

  HeadingPart(WorksheetContent content, Governing governing) {
    this.content = content;
    this.governing = governing;
  }

  void write(Flow flow) {
    List<Finding> deciding = governing.findings();
    flow.add(
        new Columns(
            List.of(titles(), List.of(new VerdictBox(content.judgement().verdict()))),
            List.of(0.6f, 0.4f),
            14));
    flow.gap(8);
    flow.add(Paragraph.of(reason(deciding.get(0)), new Style(true, 9.5f, 0)));
    flow.gap(4);
    judgedOn().forEach(flow::add);
    flow.gap(7);
    flow.add(CautionBox.of(deciding));
  }

  private List<Block> titles() {
    String prepared =
        content.preparedBy().isBlank() ? "" : " · prepared by " + content.preparedBy();
    return List.of(
        Paragraph.of("GAS TEMPERATURE AND PRESSURE WORKSHEET", Style.SMALL.strong()),
        new Gap(2),
        new Paragraph("H1", List.of(new Run(content.title(), Style.TITLE)), false),
        new Gap(2),
        Paragraph.of(
            "Job " + content.number() + " · revision " + content.revision() + prepared,
            Style.BODY));
  }

  /** For example {@code Step 1, receiver: highest gas temperature 107.3 °C, limit 65 °C: ...}. */
  private String reason(Finding finding) {
    FindingNumbers numbers = new FindingNumbers(finding, content.units());
    StringBuilder sentence = new StringBuilder("Step ");
    sentence.append(finding.step()).append(", ").append(finding.vessel()).append(": ");
    if (Governing.hasBar(finding)) {
      sentence.append(Prose.tidy(finding.quantity())).append(' ').append(numbers.predicted());
      sentence.append('\u00a0').append(numbers.unit());
      sentence.append(", limit ").append(numbers.limit());
      sentence.append('\u00a0').append(numbers.unit());
      finding
          .limitOrigin()
          .ifPresent(origin -> sentence.append(" (").append(Prose.tidy(origin)).append(')'));
      sentence.append(": ");
    } else if (finding.predicted().isPresent()) {
      sentence.append(Prose.tidy(finding.title())).append(": ");
    }
    String why = Prose.sentence(finding.reason());
    return sentence + (Governing.hasBar(finding) ? Prose.continued(why) : why);
  }

  private List<Block> judgedOn() {
    if (content.judgement().judgedOn() == JudgeOn.BOUNDS) {
      return List.of(
          Paragraph.of(
              "Judged on the bounding paths: no credit is taken for heat that the wall takes up or"
                  + " gives off.",
              Style.BODY));
    }
    List<Block> blocks = new ArrayList<>();
    blocks.add(
        Paragraph.of(
            new Run("CREDIT FOR WALL HEAT. ", Style.STRONG),
            new Run(
                "By the job's choice the verdict rests on the modelled path, which counts on heat"
                    + " that the wall takes up or gives off. The bounds without that credit are"
                    + " printed beside it. Uncertainty set against the user:",
                Style.BODY)));
    for (StepResult step : content.result().steps()) {
      blocks.add(Paragraph.of(allowance(step), Style.BODY));
    }
    return blocks;
  }

  private static String allowance(StepResult result) {
    Step step = result.step();
    return "Step "
        + step.id()
        + ": "
        + result
            .credited()
            .map(credited -> Prose.sentence(credited.allowance()))
            .orElse("no modelled path, so nothing is credited.");
  }
}
