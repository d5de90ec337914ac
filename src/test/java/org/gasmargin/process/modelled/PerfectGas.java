package org.gasmargin.process.modelled;

import java.util.Set;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.Hazard;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.gas.ValidityRange;

/**
 * An ideal gas with a constant heat capacity, for which filling and venting have closed forms.
 *
 * @param gamma ratio of the heat capacities
 * @param molarMass kg/mol
 */
record PerfectGas(double gamma, double molarMass) implements Gas {

  private double cv() {
    return MOLAR_GAS_CONSTANT / (gamma - 1);
  }

  @Override
  public String id() {
    return "perfect";
  }

  @Override
  public String name() {
    return "Perfect gas";
  }

  @Override
  public ValidityRange validity() {
    return new ValidityRange(1, 1e5, 1e12, 1e5);
  }

  @Override
  public Set<Hazard> hazards() {
    return Set.of();
  }

  @Override
  public String citation() {
    return "p = rho R T";
  }

  @Override
  public State at(double temperature, double molarDensity) {
    if (!(temperature > 1 && temperature < 1e5 && molarDensity > 0 && molarDensity < 1e9)) {
      throw new OutsideValidity(temperature + " K, " + molarDensity + " mol/m3");
    }
    double rt = MOLAR_GAS_CONSTANT * temperature;
    double u = cv() * temperature;
    return new State(
        temperature,
        molarDensity,
        molarDensity * rt,
        u,
        u + rt,
        cv() * Math.log(temperature) - MOLAR_GAS_CONSTANT * Math.log(molarDensity),
        cv(),
        cv() + MOLAR_GAS_CONSTANT,
        Math.sqrt(gamma * rt / molarMass),
        molarDensity * MOLAR_GAS_CONSTANT,
        rt);
  }

  @Override
  public State atTemperaturePressure(double temperature, double pressure) {
    return at(temperature, pressure / (MOLAR_GAS_CONSTANT * temperature));
  }

  @Override
  public State atDensityEnergy(double molarDensity, double internalEnergy, double guess) {
    return at(internalEnergy / cv(), molarDensity);
  }

  @Override
  public State atDensityPressure(double molarDensity, double pressure) {
    return at(pressure / (MOLAR_GAS_CONSTANT * molarDensity), molarDensity);
  }

  @Override
  public State atDensityEntropy(double molarDensity, double entropy) {
    double logT = (entropy + MOLAR_GAS_CONSTANT * Math.log(molarDensity)) / cv();
    return at(Math.exp(logT), molarDensity);
  }

  @Override
  public State atPressureEntropy(double pressure, double entropy) {
    double logT =
        (entropy + MOLAR_GAS_CONSTANT * Math.log(pressure / MOLAR_GAS_CONSTANT))
            / (cv() + MOLAR_GAS_CONSTANT);
    return atTemperaturePressure(Math.exp(logT), pressure);
  }

  @Override
  public State atPressureEnthalpy(double pressure, double enthalpy) {
    return atTemperaturePressure(enthalpy / (cv() + MOLAR_GAS_CONSTANT), pressure);
  }

  /** About that of air. */
  @Override
  public double viscosity(State state) {
    return 1.8e-5 * Math.pow(state.temperature() / 300, 0.7);
  }

  /** About that of air. */
  @Override
  public double thermalConductivity(State state) {
    return 0.026 * Math.pow(state.temperature() / 300, 0.8);
  }

  @Override
  public double idealCp(double temperature) {
    return cv() + MOLAR_GAS_CONSTANT;
  }
}
