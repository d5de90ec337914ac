/** Bounding paths of a step and the envelope over all of them. */
@NullMarked
package org.gasmargin.process.bounds;

import org.jspecify.annotations.NullMarked;
