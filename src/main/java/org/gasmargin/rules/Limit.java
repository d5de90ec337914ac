package org.gasmargin.rules;

import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.units.Quantity;

/**
 * A design limit that the user typed in.
 *
 * @param kind what it limits
 * @param value the limit; where it has a tolerance, the end that is nearer to the gas counts
 * @param readFrom where the user read it
 * @param requiredMargin margin that the user asks for, a difference in SI, zero or above; empty
 *     leaves it to the rule
 */
public record Limit(
    LimitKind kind, Quantity value, Optional<String> readFrom, OptionalDouble requiredMargin) {}
