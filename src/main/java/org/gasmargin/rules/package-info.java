/** Limits, rule packs, verdicts and findings. Knows no page. */
@NullMarked
package org.gasmargin.rules;

import org.jspecify.annotations.NullMarked;
