/** Vessels, walls, materials and heat-transfer correlations. */
@NullMarked
package org.gasmargin.vessel;

import org.jspecify.annotations.NullMarked;
