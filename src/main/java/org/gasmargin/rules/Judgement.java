package org.gasmargin.rules;

import java.util.Comparator;
import java.util.List;

/**
 * The findings of a job, worst first.
 *
 * @param judgedOn bounds or modelled path
 * @param findings never empty
 */
public record Judgement(JudgeOn judgedOn, List<Finding> findings) {

  /** Sorts worst first and keeps the order of steps within one verdict. */
  public Judgement {
    if (findings.isEmpty()) {
      throw new IllegalArgumentException("a judgement without findings would look like a pass");
    }
    findings = findings.stream().sorted(Comparator.comparing(Finding::verdict).reversed()).toList();
  }

  /** The worst of the findings. */
  public Verdict verdict() {
    return findings.get(0).verdict();
  }
}
