/**
 * A thin layer over PDFBox that flows tagged text, tables and figures down pages and knows nothing
 * of gases. Coordinates are points (1/72 inch) from the top left corner of a page, downwards.
 */
@NullMarked
package org.gasmargin.worksheet.layout;

import org.jspecify.annotations.NullMarked;
