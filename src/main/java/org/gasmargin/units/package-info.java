/** Quantities, units and intervals: the only place where a number is not in SI. */
@NullMarked
package org.gasmargin.units;

import org.jspecify.annotations.NullMarked;
