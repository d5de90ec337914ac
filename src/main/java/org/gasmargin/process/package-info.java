/** Steps, their bounding paths, the modelled path and the envelope. Knows no limit and no rule. */
@NullMarked
package org.gasmargin.process;

import org.jspecify.annotations.NullMarked;
