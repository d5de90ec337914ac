package org.gasmargin.rules;

import java.util.Comparator;
import java.util.List;

/**
 * The findings of a job, worst first.
 *
 * @param judgedOn bounds or modelled path
 * @param findings never empty
 * @param packs the rule packs that were used, by name
 * @param notApplied rules that were looked at and do not concern a step, with the reason
 */
public record Judgement(
    JudgeOn judgedOn, List<Finding> findings, List<PackUsed> packs, List<NotApplied> notApplied) {

  /** Sorts worst first and keeps the order of steps within one verdict. */
  public Judgement {
    if (findings.isEmpty()) {
      throw new IllegalArgumentException("a judgement without findings would look like a pass");
    }
    findings = findings.stream().sorted(Comparator.comparing(Finding::verdict).reversed()).toList();
    packs = List.copyOf(packs);
    notApplied = List.copyOf(notApplied);
  }

  /** The worst of the findings. */
  public Verdict verdict() {
    return findings.get(0).verdict();
  }
}
