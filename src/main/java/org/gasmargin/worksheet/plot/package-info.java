/** Plots and margin bars that read in black and white. */
@NullMarked
package org.gasmargin.worksheet.plot;

import org.jspecify.annotations.NullMarked;
