package org.gasmargin.job;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.Hazard;
import org.gasmargin.gas.State;
import org.gasmargin.gas.ValidityRange;

/** A gas that has a name and no properties: the reader needs no more. */
record NamedGas(String id) implements Gas {
  static final List<String> NAMES =
      List.of("air", "argon", "helium", "hydrogen", "methane", "nitrogen", "oxygen");
  static final GasNames GASES =
      new GasNames(
          name -> NAMES.contains(name) ? Optional.of(new NamedGas(name)) : Optional.empty(), NAMES);

  @Override
  public String name() {
    return id;
  }

  @Override
  public double molarMass() {
    throw new UnsupportedOperationException();
  }

  @Override
  public ValidityRange validity() {
    throw new UnsupportedOperationException();
  }

  @Override
  public Set<Hazard> hazards() {
    throw new UnsupportedOperationException();
  }

  @Override
  public String citation() {
    throw new UnsupportedOperationException();
  }

  @Override
  public State at(double temperature, double molarDensity) {
    throw new UnsupportedOperationException();
  }

  @Override
  public State atTemperaturePressure(double temperature, double pressure) {
    throw new UnsupportedOperationException();
  }

  @Override
  public State atDensityEnergy(
      double molarDensity, double internalEnergy, double temperatureGuess) {
    throw new UnsupportedOperationException();
  }

  @Override
  public State atDensityPressure(double molarDensity, double pressure) {
    throw new UnsupportedOperationException();
  }

  @Override
  public State atDensityEntropy(double molarDensity, double entropy) {
    throw new UnsupportedOperationException();
  }

  @Override
  public State atPressureEntropy(double pressure, double entropy) {
    throw new UnsupportedOperationException();
  }

  @Override
  public State atPressureEnthalpy(double pressure, double enthalpy) {
    throw new UnsupportedOperationException();
  }

  @Override
  public double viscosity(State state) {
    throw new UnsupportedOperationException();
  }

  @Override
  public double thermalConductivity(State state) {
    throw new UnsupportedOperationException();
  }

  @Override
  public double idealCp(double temperature) {
    throw new UnsupportedOperationException();
  }
}
