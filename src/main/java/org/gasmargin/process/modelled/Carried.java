package org.gasmargin.process.modelled;

import org.gasmargin.gas.State;

/** The energy that comes with each unit by which the extent of the gas grows. */
sealed interface Carried {

  /** Energy per unit of extent. */
  double energy(State gas);

  /** Derivative by the temperature at constant density. */
  double byTemperature(State gas);

  /** Derivative by the molar density at constant temperature. */
  double byDensity(State gas);

  /**
   * Gas from a constant supply brings the supply's total enthalpy.
   *
   * @param enthalpy J/mol
   */
  record Supply(double enthalpy) implements Carried {
    @Override
    public double energy(State gas) {
      return enthalpy;
    }

    @Override
    public double byTemperature(State gas) {
      return 0;
    }

    @Override
    public double byDensity(State gas) {
      return 0;
    }
  }

  /** Gas that leaves takes its own enthalpy, J/mol. */
  record Own() implements Carried {
    @Override
    public double energy(State gas) {
      return gas.enthalpy();
    }

    @Override
    public double byTemperature(State gas) {
      return gas.cv() + gas.dpdT() / gas.molarDensity();
    }

    @Override
    public double byDensity(State gas) {
      double density = gas.molarDensity();
      return gas.dudRho() + (gas.dpdRho() - gas.pressure() / density) / density;
    }
  }

  /** Growing volume does work against the pressure: minus p, J/m3. */
  record Work() implements Carried {
    @Override
    public double energy(State gas) {
      return -gas.pressure();
    }

    @Override
    public double byTemperature(State gas) {
      return -gas.dpdT();
    }

    @Override
    public double byDensity(State gas) {
      return -gas.dpdRho();
    }
  }
}
