package org.gasmargin.gas.transport;

import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;

/**
 * Stands where no correlation is carried for a property, and refuses every state.
 *
 * @param gasName name of the gas in messages
 * @param property name of the property
 */
public record NoCorrelation(String gasName, String property) implements Viscosity, Conductivity {
  @Override
  public double at(State state) {
    throw new OutsideValidity(
        "no correlation of the " + property + " of " + gasName + " is carried, so it is unknown");
  }
}
