package org.gasmargin.worksheet.handcheck;

import java.util.List;
import java.util.Optional;

/**
 * The governing number redone by a closed form of the ideal gas, beside the real-gas value.
 *
 * @param what which number of which step
 * @param title the closed form
 * @param lines filled in
 * @param comparison ideal against real, in sentences: values, difference, which way the formula
 *     leans, why, and the band
 * @param agreement whether the real-gas value lies in the band; empty if no band is known
 */
public record HandCheck(
    String what,
    String title,
    List<Line> lines,
    List<String> comparison,
    Optional<Boolean> agreement) {
  /** Copies the lists. */
  public HandCheck {
    lines = List.copyOf(lines);
    comparison = List.copyOf(comparison);
  }
}
