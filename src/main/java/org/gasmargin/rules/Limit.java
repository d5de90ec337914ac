package org.gasmargin.rules;

import java.util.Optional;
import org.gasmargin.units.Quantity;

/**
 * A design limit that the user typed in.
 *
 * @param kind what it limits
 * @param value the limit; where it has a tolerance, the end that is nearer to the gas counts
 * @param readFrom where the user read it
 */
public record Limit(LimitKind kind, Quantity value, Optional<String> readFrom) {}
