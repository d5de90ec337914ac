/**
 * Closed forms of the ideal gas with which a reviewer redoes the governing number on a pocket
 * calculator. Computes and words; draws nothing.
 */
@NullMarked
package org.gasmargin.worksheet.handcheck;

import org.jspecify.annotations.NullMarked;
