package org.gasmargin.process.modelled;

import org.gasmargin.gas.Gas;
import org.gasmargin.gas.State;

/**
 * The gas of a step: how its density, energy and rate of change follow from its extent, its state
 * and the heat that it gives up.
 *
 * @param gas the gas
 * @param content how the density follows from the extent
 * @param carried energy that comes with the extent
 * @param opening what sets the rate of the extent
 */
record GasSide(Gas gas, Content content, Carried carried, Opening opening) {

  /** State of the gas. */
  State state(double extent, double temperature) {
    return gas.at(temperature, content.density(extent));
  }

  /** Whether the pressure is prescribed and the rate follows. */
  boolean onRamp() {
    return opening instanceof Opening.Ramp;
  }

  /** Whether gas flows in. */
  boolean fills() {
    return carried instanceof Carried.Supply;
  }

  /** Mass flow of the jet that enters at a rate of the extent, kg/s. */
  double inflow(double rate) {
    return fills() ? Math.max(0, rate * gas.molarMass()) : 0;
  }

  /** Internal energy of all gas, J. */
  double energy(State state, double extent) {
    return content.amount(extent) * state.internalEnergy();
  }

  /** Derivative of the internal energy of all gas by the extent at constant temperature. */
  double energyByExtent(State state, double extent) {
    double own = content instanceof Content.Rigid ? state.internalEnergy() : 0;
    return own + content.amount(extent) * state.dudRho() * content.densitySlope(extent);
  }

  /** Derivative of the internal energy of all gas by the temperature at constant extent, J/K. */
  double heatCapacity(State state, double extent) {
    return content.amount(extent) * state.cv();
  }

  /** Rate of the extent where it does not depend on the heat. */
  Opening.Rate rate(State state) {
    return opening instanceof Opening.ByState byState
        ? byState.law().rate(state)
        : new Opening.Rate(((Opening.Constant) opening).rate(), 0, 0);
  }

  /**
   * Rate of the extent; on a ramp the one that keeps the pressure on it.
   *
   * @param wallHeat heat flow into a wall that the gas touches in full, W
   */
  double rate(State state, double extent, double wallHeat) {
    if (opening instanceof Opening.Ramp ramp) {
      return (ramp.rise() + wallHeat * pressureByHeat(state, extent))
          / pressureByExtent(state, extent);
    }
    return rate(state).value();
  }

  /** Derivative of that rate by the heat flow. */
  double rateByHeat(State state, double extent) {
    return onRamp() ? pressureByHeat(state, extent) / pressureByExtent(state, extent) : 0;
  }

  /**
   * Row of the extent in an implicit stage.
   *
   * @param extent at the end of the stage
   * @param change of the extent over the stage
   * @return rate of the extent over the stage
   */
  double stage(
      double time,
      State state,
      double extent,
      double change,
      double weight,
      double[] residual,
      BandMatrix m) {
    double slope = content.densitySlope(extent);
    if (opening instanceof Opening.Ramp ramp) {
      residual[GasWallSystem.EXTENT] = state.pressure() - ramp.pressure(time);
      m.set(GasWallSystem.EXTENT, GasWallSystem.EXTENT, state.dpdRho() * slope);
      m.set(GasWallSystem.EXTENT, GasWallSystem.TEMPERATURE, state.dpdT());
      return change / weight;
    }
    Opening.Rate rate = rate(state);
    residual[GasWallSystem.EXTENT] = change - weight * rate.value();
    m.set(GasWallSystem.EXTENT, GasWallSystem.EXTENT, 1 - weight * rate.byDensity() * slope);
    m.set(GasWallSystem.EXTENT, GasWallSystem.TEMPERATURE, -weight * rate.byTemperature());
    return rate.value();
  }

  /** Fall of the pressure by heat out of the gas at constant extent, Pa/J. */
  private double pressureByHeat(State state, double extent) {
    return state.dpdT() * content.contact(extent) / heatCapacity(state, extent);
  }

  /** Rise of the pressure by the extent without heat. */
  private double pressureByExtent(State state, double extent) {
    double excess = carried.energy(state) - energyByExtent(state, extent);
    return state.dpdT() * excess / heatCapacity(state, extent)
        + state.dpdRho() * content.densitySlope(extent);
  }
}
