package org.gasmargin.process;

import java.util.List;

/**
 * What was computed for a whole procedure.
 *
 * @param procedure what was asked
 * @param steps one result a step, in order
 */
public record ProcedureResult(Procedure procedure, List<StepResult> steps) {

  /** Copies the list. */
  public ProcedureResult {
    steps = List.copyOf(steps);
  }
}
