package org.gasmargin.worksheet;

import java.util.Set;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.Hazard;
import org.gasmargin.gas.State;
import org.gasmargin.gas.ValidityRange;

/** An ideal gas with constant heat capacity, for pages only. */
record ConstantCpGas(String id, String name, double molarMass, double cpOverR) implements Gas {
  static final ConstantCpGas AIR = new ConstantCpGas("air", "Air", 0.0289586, 3.5);
  static final ConstantCpGas HELIUM = new ConstantCpGas("helium", "Helium", 0.0040026, 2.5);

  @Override
  public ValidityRange validity() {
    return new ValidityRange(60, 2000, 2e9, 400);
  }

  @Override
  public Set<Hazard> hazards() {
    return Set.of(Hazard.OXIDISER);
  }

  @Override
  public String citation() {
    return "Ideal gas of constant heat capacity (test data)";
  }

  @Override
  public State at(double temperature, double molarDensity) {
    double r = MOLAR_GAS_CONSTANT;
    double cp = cpOverR * r;
    double cv = cp - r;
    double entropy = cv * Math.log(temperature) - r * Math.log(molarDensity);
    return new State(
        temperature,
        molarDensity,
        molarDensity * r * temperature,
        cv * temperature,
        cp * temperature,
        entropy,
        cv,
        cp,
        Math.sqrt(cp / cv * r * temperature / molarMass),
        molarDensity * r,
        r * temperature);
  }

  @Override
  public State atTemperaturePressure(double temperature, double pressure) {
    return at(temperature, pressure / (MOLAR_GAS_CONSTANT * temperature));
  }

  @Override
  public State atDensityEnergy(double molarDensity, double internalEnergy, double guess) {
    return at(internalEnergy / ((cpOverR - 1) * MOLAR_GAS_CONSTANT), molarDensity);
  }

  @Override
  public State atDensityPressure(double molarDensity, double pressure) {
    return at(pressure / (MOLAR_GAS_CONSTANT * molarDensity), molarDensity);
  }

  @Override
  public State atDensityEntropy(double molarDensity, double entropy) {
    double r = MOLAR_GAS_CONSTANT;
    return at(Math.exp((entropy + r * Math.log(molarDensity)) / ((cpOverR - 1) * r)), molarDensity);
  }

  @Override
  public State atPressureEntropy(double pressure, double entropy) {
    double r = MOLAR_GAS_CONSTANT;
    double temperature = Math.exp((entropy + r * Math.log(pressure / r)) / (cpOverR * r));
    return atTemperaturePressure(temperature, pressure);
  }

  @Override
  public State atPressureEnthalpy(double pressure, double enthalpy) {
    return atTemperaturePressure(enthalpy / (cpOverR * MOLAR_GAS_CONSTANT), pressure);
  }

  @Override
  public double viscosity(State state) {
    return 1.8e-5;
  }

  @Override
  public double thermalConductivity(State state) {
    return 0.026;
  }

  @Override
  public double idealCp(double temperature) {
    return cpOverR * MOLAR_GAS_CONSTANT;
  }
}
