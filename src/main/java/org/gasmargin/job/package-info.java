/** Reads a job file into the records of the other rooms. */
@NullMarked
package org.gasmargin.job;

import org.jspecify.annotations.NullMarked;
