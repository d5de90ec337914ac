/** The gases that the program knows, read from data files when asked for. */
@NullMarked
package org.gasmargin.gas.catalogue;

import org.jspecify.annotations.NullMarked;
