/**
 * The modelled path: well-mixed gas that exchanges heat with a conducting wall, integrated by an
 * implicit method with error control.
 */
@NullMarked
package org.gasmargin.process.modelled;

import org.jspecify.annotations.NullMarked;
