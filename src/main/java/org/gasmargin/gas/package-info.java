/** Real-gas properties. Knows no vessel and no time. */
@NullMarked
package org.gasmargin.gas;

import org.jspecify.annotations.NullMarked;
