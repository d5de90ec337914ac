package org.gasmargin.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.rules.Judgement;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;

/** The short table of verdicts on the terminal. */
final class VerdictTable {
  private static final List<String> HEADINGS =
      List.of("verdict", "step", "vessel", "quantity", "predicted", "limit", "margin");

  private final DisplayUnits units;

  VerdictTable(DisplayUnits units) {
    this.units = units;
  }

  /** The lines of the table: the job's verdict first, then a line a finding, worst first. */
  List<String> lines(String title, Judgement judgement) {
    List<String> lines = new ArrayList<>();
    lines.add(judgement.verdict().words() + "  " + title);
    lines.add(
        judgement.judgedOn() == JudgeOn.BOUNDS
            ? "judged on the bounding paths (no credit for heat taken by the wall)"
            : "judged on the modelled path (heat taken by the wall is credited)");
    lines.add("");
    List<List<String>> rows = new ArrayList<>();
    rows.add(HEADINGS);
    for (Finding finding : judgement.findings()) {
      rows.add(row(finding));
    }
    int[] widths = new int[HEADINGS.size()];
    for (List<String> row : rows) {
      for (int i = 0; i < widths.length; i++) {
        widths[i] = Math.max(widths[i], row.get(i).length());
      }
    }
    for (List<String> row : rows) {
      StringBuilder line = new StringBuilder();
      for (int i = 0; i < widths.length; i++) {
        line.append(String.format(Locale.ROOT, "%-" + (widths[i] + 2) + "s", row.get(i)));
      }
      lines.add(line.toString().stripTrailing());
    }
    lines.add("");
    lines.add(
        "This is a prediction to be checked by a competent person, not a permission. Local codes,");
    lines.add("the equipment's documents and licensed inspection decide.");
    return lines;
  }

  private List<String> row(Finding finding) {
    return List.of(
        finding.verdict().words(),
        finding.step(),
        finding.vessel(),
        finding.quantity(),
        value(finding.predicted(), finding.dimension()),
        value(finding.limit(), finding.dimension()),
        value(finding.margin(), finding.dimension().difference()));
  }

  private String value(OptionalDouble si, Dimension dimension) {
    return si.isPresent() ? units.format(si.getAsDouble(), dimension) : "-";
  }
}
