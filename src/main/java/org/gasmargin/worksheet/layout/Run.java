package org.gasmargin.worksheet.layout;

/**
 * Text in one style.
 *
 * @param text a line feed forces a new line
 * @param style how it looks
 */
public record Run(String text, Style style) {}
