package org.gasmargin.rules;

import java.util.Comparator;
import java.util.List;

/**
 * The findings of a job: the worst verdict first, dangers first within one verdict.
 *
 * @param judgedOn bounds or modelled path
 * @param findings never empty
 * @param packs the rule packs that were used, by name
 * @param notApplied rules that were looked at and do not concern a step, with the reason
 */
public record Judgement(
    JudgeOn judgedOn, List<Finding> findings, List<PackUsed> packs, List<NotApplied> notApplied) {

  private static final Comparator<Finding> WORST_FIRST =
      Comparator.comparing(Finding::verdict).reversed().thenComparing(Finding::severity);

  /** Sorts worst first; what is equally bad keeps the order of steps. */
  public Judgement {
    if (findings.isEmpty()) {
      throw new IllegalArgumentException("a judgement without findings would look like a pass");
    }
    findings = findings.stream().sorted(WORST_FIRST).toList();
    packs = List.copyOf(packs);
    notApplied = List.copyOf(notApplied);
  }

  /** The worst of the findings. */
  public Verdict verdict() {
    return findings.get(0).verdict();
  }
}
