package org.gasmargin.rules;

/**
 * Where a rule or a figure comes from.
 *
 * @param words the source
 * @param status how far it may be trusted
 */
record SourceText(String words, SourceStatus status) {}
