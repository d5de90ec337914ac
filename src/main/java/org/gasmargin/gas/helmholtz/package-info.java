/** Gases whose properties come from a Helmholtz-energy equation of state. */
@NullMarked
package org.gasmargin.gas.helmholtz;

import org.jspecify.annotations.NullMarked;
