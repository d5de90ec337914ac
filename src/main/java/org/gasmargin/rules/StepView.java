package org.gasmargin.rules;

import java.util.List;
import java.util.Optional;
import org.gasmargin.units.DisplayUnits;

/**
 * One step as rules see it.
 *
 * @param step identifier of the step
 * @param vessel name of the vessel
 * @param operands what stands behind each name
 * @param limits the user's limits of the vessel
 * @param distrust why nothing computed of this step may be judged, if so
 * @param units for the words of findings
 */
record StepView(
    String step,
    String vessel,
    Operands operands,
    List<Limit> limits,
    Optional<String> distrust,
    DisplayUnits units) {

  StepView {
    limits = List.copyOf(limits);
  }
}
