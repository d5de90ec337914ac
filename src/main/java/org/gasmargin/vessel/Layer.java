package org.gasmargin.vessel;

import org.gasmargin.units.Interval;

/**
 * One layer of a wall, counted from the inside.
 *
 * @param material what it is made of
 * @param thickness m
 */
public record Layer(Material material, Interval thickness) {}
