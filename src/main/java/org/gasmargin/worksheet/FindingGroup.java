package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.gasmargin.rules.Finding;

/**
 * The findings of one rule for one vessel, in which steps with the same numbers share a line: an
 * extreme that an earlier step leaves behind governs the later ones too.
 *
 * @param lines at least one
 */
record FindingGroup(List<Line> lines) {
  private static final int FEW = 4;

  /** Copies the list. */
  FindingGroup {
    lines = List.copyOf(lines);
  }

  /**
   * One set of numbers.
   *
   * @param finding of the first of the steps
   * @param steps identifiers of all steps with these numbers
   */
  record Line(Finding finding, List<String> steps) {
    /** The steps as they are printed. */
    String stepWords() {
      return String.join(steps.size() <= FEW ? ",\u00a0" : ", ", steps);
    }
  }

  /** Groups in the order of their first findings. */
  static List<FindingGroup> of(List<Finding> ranked) {
    Map<String, List<Finding>> groups = new LinkedHashMap<>();
    for (Finding finding : ranked) {
      groups
          .computeIfAbsent(finding.rule() + " " + finding.vessel(), key -> new ArrayList<>())
          .add(finding);
    }
    return groups.values().stream().map(findings -> new FindingGroup(merged(findings))).toList();
  }

  /** The first finding, which names rule, source and caution of all. */
  Finding first() {
    return lines.get(0).finding();
  }

  private static List<Line> merged(List<Finding> findings) {
    Map<List<Object>, List<Finding>> same = new LinkedHashMap<>();
    for (Finding finding : findings) {
      same.computeIfAbsent(numbers(finding), key -> new ArrayList<>()).add(finding);
    }
    return same.values().stream()
        .map(equal -> new Line(equal.get(0), equal.stream().map(Finding::step).toList()))
        .toList();
  }

  private static List<Object> numbers(Finding finding) {
    return List.of(
        finding.verdict(),
        finding.predicted(),
        finding.limit(),
        finding.margin(),
        finding.requiredMargin(),
        finding.reason());
  }
}
