/** Where one phase ends: saturation, dew and melting lines of one fluid. */
@NullMarked
package org.gasmargin.gas.phase;

import org.jspecify.annotations.NullMarked;
