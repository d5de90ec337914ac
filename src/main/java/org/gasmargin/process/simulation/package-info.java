/** Runs a whole procedure: bounds, envelope and modelled path of every step. */
@NullMarked
package org.gasmargin.process.simulation;

import org.jspecify.annotations.NullMarked;
