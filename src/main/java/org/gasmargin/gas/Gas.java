package org.gasmargin.gas;

import java.util.Set;

/**
 * A gas of fixed composition with an equation of state. All methods refuse, with {@link
 * OutsideValidity}, a state that is not finite, lies outside the validity range, or is not single
 * phase gas or dense fluid. Implementations are immutable and safe to share.
 */
public interface Gas {
  /** Universal gas constant, J/(mol K), exact by the SI of 2019. */
  double MOLAR_GAS_CONSTANT = 8.31446261815324;

  /** Identifier used in job files, for example {@code nitrogen}. */
  String id();

  /** Name for people, for example {@code Nitrogen}. */
  String name();

  /** Molar mass M, kg/mol. */
  double molarMass();

  /** The range within which the equation is used. */
  ValidityRange validity();

  /** General hazards of the gas. */
  Set<Hazard> hazards();

  /** Citation of the equation of state, one line. */
  String citation();

  /**
   * State from temperature and density, explicit in the equation of state.
   *
   * @param temperature T, K
   * @param molarDensity rho, mol/m3, above zero
   */
  State at(double temperature, double molarDensity);

  /** State from temperature, K, and pressure, Pa absolute, above zero. */
  State atTemperaturePressure(double temperature, double pressure);

  /**
   * State from molar density, mol/m3, and internal energy, J/mol.
   *
   * @param temperatureGuess start of the iteration, K; only speed depends on it
   */
  State atDensityEnergy(double molarDensity, double internalEnergy, double temperatureGuess);

  /** State from molar density, mol/m3, and pressure, Pa absolute. */
  State atDensityPressure(double molarDensity, double pressure);

  /** State from molar density, mol/m3, and entropy, J/(mol K). */
  State atDensityEntropy(double molarDensity, double entropy);

  /** State from pressure, Pa absolute, and entropy, J/(mol K): the isentrope. */
  State atPressureEntropy(double pressure, double entropy);

  /** State from pressure, Pa absolute, and enthalpy, J/mol: throttling. */
  State atPressureEnthalpy(double pressure, double enthalpy);

  /** Dynamic viscosity at a state, Pa s. */
  double viscosity(State state);

  /** Thermal conductivity at a state, W/(m K). */
  double thermalConductivity(State state);

  /**
   * Isobaric heat capacity of the gas at zero pressure, J/(mol K), for the ideal-gas hand check.
   *
   * @param temperature T, K
   */
  double idealCp(double temperature);
}
