package org.gasmargin.process.bounds;

import org.gasmargin.gas.Gas;
import org.gasmargin.gas.State;

/**
 * The way of a step for one law, coordinate and exchange of heat, apart from time.
 *
 * @param gas the gas
 * @param law without exchange of heat
 * @param coordinate what the step prescribes
 * @param exchange how the surroundings intervene
 */
record Course(Gas gas, PathLaw law, Coordinate coordinate, Exchange exchange) {

  /** The state at the start of the course: settled, at constant volume, as the exchange asks. */
  State enter(State state) {
    double held = exchange.held(state.temperature());
    return held == state.temperature() ? state : gas.at(held, state.molarDensity());
  }

  /** One stretch of the course, to a value of the coordinate. */
  State advance(State from, double value) {
    State next = coordinate.move(law, gas, from, value);
    double held = exchange.held(next.temperature());
    return held == next.temperature()
        ? next
        : coordinate.move(new PathLaw.Isothermal(held), gas, from, value);
  }

  /** The same course followed by pressure, to stop at a pressure. */
  Course byPressure() {
    return new Course(gas, law, Coordinate.PRESSURE, exchange);
  }
}
