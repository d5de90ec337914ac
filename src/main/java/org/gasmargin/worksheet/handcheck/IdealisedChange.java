package org.gasmargin.worksheet.handcheck;

/**
 * Work and heat of one of the classical changes that bound a step.
 *
 * @param step identifier of the step
 * @param change which change of which gas
 * @param work formula of the work done by the gas
 * @param heat formula of the heat taken in by the gas
 * @param value of both, J
 */
public record IdealisedChange(
    String step, String change, String work, String heat, IdealChange value) {}
