/**
 * The Helmholtz energy as an explicit function of temperature and density, with its derivatives.
 * Sums terms read from data; knows no phases.
 */
@NullMarked
package org.gasmargin.gas.equation;

import org.jspecify.annotations.NullMarked;
