package org.gasmargin.worksheet;

import java.util.Comparator;
import java.util.List;
import org.gasmargin.process.Site;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.Verdict;
import org.gasmargin.worksheet.plot.MarginBar;

/** Picks the findings that decide the verdict. */
final class Governing {
  private final WorksheetContent content;

  Governing(WorksheetContent content) {
    this.content = content;
  }

  /** The findings with the worst verdict, the one nearest to or furthest over its limit first. */
  List<Finding> findings() {
    return ranked().stream()
        .filter(finding -> finding.verdict() == content.judgement().verdict())
        .toList();
  }

  /** All findings, worst first, among equals by how much of the way to the limit is used. */
  List<Finding> ranked() {
    return content.judgement().findings().stream()
        .sorted(
            Comparator.comparing(Finding::verdict)
                .reversed()
                .thenComparing(Finding::severity)
                .thenComparing(Comparator.comparingDouble(this::reached).reversed()))
        .toList();
  }

  /** The same without those that were not assessed. */
  List<Finding> assessed() {
    return ranked().stream().filter(f -> f.verdict() != Verdict.NOT_ASSESSED).toList();
  }

  /** The bar of a finding that has all its numbers. */
  MarginBar bar(Finding finding) {
    return MarginBar.of(
        reference(finding),
        finding.predicted().orElseThrow(),
        finding.limit().orElseThrow(),
        finding.margin().orElseThrow(),
        finding.requiredMargin().orElse(0));
  }

  /** Whether the finding has the numbers of a bar. */
  static boolean hasBar(Finding finding) {
    return finding.predicted().isPresent()
        && finding.limit().isPresent()
        && finding.margin().isPresent();
  }

  private double reached(Finding finding) {
    if (hasBar(finding)) {
      return bar(finding).reached();
    }
    return finding.verdict() == Verdict.NOT_ASSESSED ? 0 : Double.NEGATIVE_INFINITY;
  }

  /** Where a bar begins: ambient temperature, atmospheric pressure, or zero. */
  private double reference(Finding finding) {
    Site site = content.result().procedure().site();
    return switch (finding.dimension()) {
      case TEMPERATURE -> site.ambientTemperature().nominal();
      case ABSOLUTE_PRESSURE -> site.atmosphericPressure().nominal();
      default -> 0;
    };
  }
}
