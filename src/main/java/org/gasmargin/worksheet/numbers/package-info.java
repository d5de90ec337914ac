/** Numbers and units as they stand on the page. */
@NullMarked
package org.gasmargin.worksheet.numbers;

import org.jspecify.annotations.NullMarked;
