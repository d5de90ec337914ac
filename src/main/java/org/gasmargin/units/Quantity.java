package org.gasmargin.units;

/**
 * A value with unit and tolerance as the user typed it, and the same in SI.
 *
 * @param si the value in SI; a pressure is absolute whatever was typed
 * @param unit the unit as typed, in which the value is shown again
 * @param typed the text as typed, for example {@code 12 bar(g) ± 1 bar}
 */
public record Quantity(Interval si, Unit unit, String typed) {}
