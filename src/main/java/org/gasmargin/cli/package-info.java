/** Commands, exit codes and console text. */
@NullMarked
package org.gasmargin.cli;

import org.jspecify.annotations.NullMarked;
