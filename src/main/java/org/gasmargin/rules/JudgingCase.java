package org.gasmargin.rules;

import java.util.List;
import java.util.Map;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.units.DisplayUnits;

/**
 * All that judging needs.
 *
 * @param result what was computed
 * @param limits the user's limits by vessel name
 * @param judgeOn bounds or modelled path
 * @param requestedPacks names of the packs that the job asks for; those that the gas asks for are
 *     added
 * @param units for the words of findings
 */
public record JudgingCase(
    ProcedureResult result,
    Map<String, List<Limit>> limits,
    JudgeOn judgeOn,
    List<String> requestedPacks,
    DisplayUnits units) {

  /** Copies the collections. */
  public JudgingCase {
    limits = Map.copyOf(limits);
    requestedPacks = List.copyOf(requestedPacks);
  }
}
