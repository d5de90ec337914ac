package org.gasmargin.rules;

import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.units.Dimension;

/**
 * What one rule says of one step.
 *
 * @param rule identifier of the rule, for example {@code general.max_pressure}
 * @param title of the rule
 * @param step identifier of the step
 * @param vessel name of the vessel
 * @param verdict the word
 * @param severity what breaking the rule means
 * @param quantity what is predicted, in words
 * @param dimension of predicted, limit, margin and required margin (margins: its difference)
 * @param predicted SI; empty if unknown
 * @param limit SI; empty if missing
 * @param limitOrigin where the limit comes from: the user's source or the rule's marked default
 * @param margin distance to the limit, positive inside, SI; empty if unknown
 * @param requiredMargin SI, zero or above; empty if unknown
 * @param path the path that leads to the predicted value, in words; may be empty
 * @param reason one sentence: why this verdict, or what to look up
 * @param caution printed with the finding
 * @param source of the rule
 * @param sourceStatus published, common practice, from memory ...
 */
public record Finding(
    String rule,
    String title,
    String step,
    String vessel,
    Verdict verdict,
    Severity severity,
    String quantity,
    Dimension dimension,
    OptionalDouble predicted,
    OptionalDouble limit,
    Optional<String> limitOrigin,
    OptionalDouble margin,
    OptionalDouble requiredMargin,
    String path,
    String reason,
    String caution,
    String source,
    String sourceStatus) {

  /** Refuses numbers that are not finite, so that a NaN can never reach the page. */
  public Finding {
    requireFinite(predicted);
    requireFinite(limit);
    requireFinite(margin);
    requireFinite(requiredMargin);
  }

  private static void requireFinite(OptionalDouble value) {
    if (value.isPresent() && !Double.isFinite(value.getAsDouble())) {
      throw new IllegalArgumentException("a finding needs finite numbers");
    }
  }
}
