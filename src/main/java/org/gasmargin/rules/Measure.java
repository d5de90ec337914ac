package org.gasmargin.rules;

import org.gasmargin.units.Dimension;

/**
 * A number with its dimension, as expressions see it.
 *
 * @param dimension what it measures
 * @param si value in SI; not finite only as the outcome of an expression
 */
record Measure(Dimension dimension, double si) {}
