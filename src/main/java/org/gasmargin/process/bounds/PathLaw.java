package org.gasmargin.process.bounds;

import java.util.Optional;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;

/**
 * What stays constant on a bounding path, and so fixes every later state without integration in
 * time.
 */
sealed interface PathLaw {

  /** The state when the gas has come from {@code from} to a pressure, Pa absolute. */
  State atPressure(Gas gas, State from, double pressure);

  /** The state when the gas has come from {@code from} to a density, mol/m3. */
  State atDensity(Gas gas, State from, double molarDensity);

  /** (drho/dp) along the path, mol/(m3 Pa). */
  double densityPerPressure(State state);

  /**
   * Rigid vessel charged from a constant supply: rho (u - h) is constant, h being the enthalpy of
   * the supply (first law for an open system; no kinetic energy at the end).
   *
   * @param supplyEnthalpy J/mol
   */
  record Charging(double supplyEnthalpy) implements PathLaw {
    private static final int MAX_STEPS = 30;
    private static final double RESOLUTION = 1e-13;

    @Override
    public State atDensity(Gas gas, State from, double molarDensity) {
      double energy = supplyEnthalpy + excess(from) / molarDensity;
      return gas.atDensityEnergy(molarDensity, energy, from.temperature());
    }

    @Override
    public State atPressure(Gas gas, State from, double pressure) {
      try {
        return newton(gas, from, pressure)
            .orElseGet(() -> ChargingBracket.solve(gas, this, from, pressure));
      } catch (OutsideValidity strayed) {
        return ChargingBracket.solve(gas, this, from, pressure);
      }
    }

    /** Newton in (T, rho) on pressure and rho (u - h); empty if it strays or does not settle. */
    private Optional<State> newton(Gas gas, State from, double pressure) {
      double excess = excess(from);
      double temperature = from.temperature();
      double density = from.molarDensity() * pressure / from.pressure();
      for (int i = 0; i < MAX_STEPS; i++) {
        State state = gas.at(temperature, density);
        double pressureGap = pressure - state.pressure();
        double excessGap = excess - excess(state);
        double excessT = density * state.cv();
        double excessRho = state.internalEnergy() - supplyEnthalpy + density * state.dudRho();
        double determinant = state.dpdT() * excessRho - state.dpdRho() * excessT;
        double dT = (pressureGap * excessRho - excessGap * state.dpdRho()) / determinant;
        double dRho = (excessGap * state.dpdT() - pressureGap * excessT) / determinant;
        if (!(Math.abs(dT) < 0.3 * temperature && Math.abs(dRho) < 0.5 * density)) {
          return Optional.empty();
        }
        temperature += dT;
        density += dRho;
        if (Math.abs(dT) < RESOLUTION * temperature && Math.abs(dRho) < RESOLUTION * density) {
          return Optional.of(gas.at(temperature, density));
        }
      }
      return Optional.empty();
    }

    @Override
    public double densityPerPressure(State state) {
      double excessT = state.molarDensity() * state.cv();
      double excessRho =
          state.internalEnergy() - supplyEnthalpy + state.molarDensity() * state.dudRho();
      return 1 / (state.dpdRho() - state.dpdT() * excessRho / excessT);
    }

    /** rho (u - h), J/m3. */
    double excess(State state) {
      return state.molarDensity() * (state.internalEnergy() - supplyEnthalpy);
    }
  }

  /** Gas left behind in a vented vessel, or trapped gas that is compressed: entropy is constant. */
  record Isentropic() implements PathLaw {
    @Override
    public State atPressure(Gas gas, State from, double pressure) {
      return gas.atPressureEntropy(pressure, from.entropy());
    }

    @Override
    public State atDensity(Gas gas, State from, double molarDensity) {
      return gas.atDensityEntropy(molarDensity, from.entropy());
    }

    @Override
    public double densityPerPressure(State state) {
      return state.cv() / (state.cp() * state.dpdRho());
    }
  }

  /**
   * The gas is held at a temperature by perfect exchange of heat.
   *
   * @param temperature K
   */
  record Isothermal(double temperature) implements PathLaw {
    @Override
    public State atPressure(Gas gas, State from, double pressure) {
      return gas.atTemperaturePressure(temperature, pressure);
    }

    @Override
    public State atDensity(Gas gas, State from, double molarDensity) {
      return gas.at(temperature, molarDensity);
    }

    @Override
    public double densityPerPressure(State state) {
      return 1 / state.dpdRho();
    }
  }
}
