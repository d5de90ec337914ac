/** Published correlations of viscosity and thermal conductivity. */
@NullMarked
package org.gasmargin.gas.transport;

import org.jspecify.annotations.NullMarked;
