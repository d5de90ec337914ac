package org.gasmargin.process;

/**
 * Something that happens within a step.
 *
 * @param time since the start of the step, s
 * @param path on which path
 * @param what in words, for example "flow through the orifice is no longer choked"
 */
public record Event(double time, PathKind path, String what) {}
