/** The PDF worksheet, the hand check and the machine-readable result. */
@NullMarked
package org.gasmargin.worksheet;

import org.jspecify.annotations.NullMarked;
