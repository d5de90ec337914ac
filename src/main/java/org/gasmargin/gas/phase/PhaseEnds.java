package org.gasmargin.gas.phase;

/**
 * The gap between gas and liquid at one temperature: no stable single phase lies between the two
 * ends. Liquid ends are infinite where no liquid is modelled.
 *
 * @param temperature T, K
 * @param vapourDensity highest density of the stable gas, mol/m3
 * @param vapourPressure pressure of that gas, Pa
 * @param liquidDensity lowest density of the stable liquid, mol/m3
 * @param liquidPressure pressure of that liquid, Pa
 */
public record PhaseEnds(
    double temperature,
    double vapourDensity,
    double vapourPressure,
    double liquidDensity,
    double liquidPressure) {}
