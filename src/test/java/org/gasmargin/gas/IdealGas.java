package org.gasmargin.gas;

import java.util.Locale;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * Ideal gas with constant heat capacities, for the closed forms of tests; never the model of a real
 * gas. The datum is u = 0 at 0 K and s = 0 at 298.15 K and 101 325 Pa.
 *
 * <p>It has no transport properties of its own: they are constants that the caller gives with
 * {@link #withTransport}, and are refused until then.
 */
public final class IdealGas implements Gas {
  private static final double DATUM_TEMPERATURE = 298.15;
  private static final double DATUM_PRESSURE = 101_325;
  private static final double MONATOMIC = 5.0 / 3;
  private static final double DIATOMIC = 7.0 / 5;
  private static final ValidityRange RANGE = new ValidityRange(1, 10_000, 1e10, 10_000);

  /** Constant transport properties. */
  private record Transport(double viscosity, double conductivity) {}

  private final String id;
  private final String name;
  private final double molarMass;
  private final double gamma;
  private final double cv;
  private final @Nullable Transport transport;

  /**
   * @param id identifier
   * @param name name for people
   * @param molarMass kg/mol, above zero
   * @param gamma ratio cp/cv, above one
   */
  public IdealGas(String id, String name, double molarMass, double gamma) {
    this(id, name, molarMass, gamma, null);
  }

  private IdealGas(
      String id, String name, double molarMass, double gamma, @Nullable Transport transport) {
    if (!(molarMass > 0 && Double.isFinite(molarMass))) {
      throw new IllegalArgumentException("molar mass must be above zero, not " + molarMass);
    }
    if (!(gamma > 1 && Double.isFinite(gamma))) {
      throw new IllegalArgumentException("gamma must be above one, not " + gamma);
    }
    this.id = id;
    this.name = name;
    this.molarMass = molarMass;
    this.gamma = gamma;
    this.transport = transport;
    cv = MOLAR_GAS_CONSTANT / (gamma - 1);
  }

  /** Gas of single atoms, gamma 5/3; molar mass in kg/mol. */
  public static IdealGas monatomic(String id, double molarMass) {
    return new IdealGas(id, "Ideal monatomic gas", molarMass, MONATOMIC);
  }

  /** Gas of rigid molecules of two atoms, gamma 7/5; molar mass in kg/mol. */
  public static IdealGas diatomic(String id, double molarMass) {
    return new IdealGas(id, "Ideal diatomic gas", molarMass, DIATOMIC);
  }

  /**
   * The same gas with constant transport properties.
   *
   * @param viscosity Pa s
   * @param conductivity W/(m K)
   */
  public IdealGas withTransport(double viscosity, double conductivity) {
    return new IdealGas(id, name, molarMass, gamma, new Transport(viscosity, conductivity));
  }

  /** Ratio of heat capacities cp/cv. */
  public double gamma() {
    return gamma;
  }

  @Override
  public String id() {
    return id;
  }

  @Override
  public String name() {
    return name;
  }

  @Override
  public double molarMass() {
    return molarMass;
  }

  @Override
  public ValidityRange validity() {
    return RANGE;
  }

  @Override
  public Set<Hazard> hazards() {
    return Set.of();
  }

  @Override
  public String citation() {
    return "Ideal gas, p = rho R T, with constant heat capacities";
  }

  @Override
  public State at(double temperature, double molarDensity) {
    require("temperature, K", temperature, RANGE.minTemperature(), RANGE.maxTemperature());
    double pressure = molarDensity * MOLAR_GAS_CONSTANT * temperature;
    require("pressure, Pa", pressure, Double.MIN_NORMAL, RANGE.maxPressure());
    double cp = gamma * cv;
    double entropy =
        cp * Math.log(temperature / DATUM_TEMPERATURE)
            - MOLAR_GAS_CONSTANT * Math.log(pressure / DATUM_PRESSURE);
    return new State(
        temperature,
        molarDensity,
        pressure,
        cv * temperature,
        cp * temperature,
        entropy,
        cv,
        cp,
        Math.sqrt(gamma * MOLAR_GAS_CONSTANT * temperature / molarMass),
        molarDensity * MOLAR_GAS_CONSTANT,
        MOLAR_GAS_CONSTANT * temperature);
  }

  @Override
  public State atTemperaturePressure(double temperature, double pressure) {
    return at(temperature, pressure / (MOLAR_GAS_CONSTANT * temperature));
  }

  @Override
  public State atDensityEnergy(
      double molarDensity, double internalEnergy, double temperatureGuess) {
    return at(internalEnergy / cv, molarDensity);
  }

  @Override
  public State atDensityPressure(double molarDensity, double pressure) {
    return at(pressure / (molarDensity * MOLAR_GAS_CONSTANT), molarDensity);
  }

  @Override
  public State atDensityEntropy(double molarDensity, double entropy) {
    // s = cp ln(T/T0) - R ln(rho R T/p0) = cv ln(T/T0) - R ln(rho R T0/p0)
    double atDatum =
        -MOLAR_GAS_CONSTANT
            * Math.log(molarDensity * MOLAR_GAS_CONSTANT * DATUM_TEMPERATURE / DATUM_PRESSURE);
    return at(DATUM_TEMPERATURE * Math.exp((entropy - atDatum) / cv), molarDensity);
  }

  @Override
  public State atPressureEntropy(double pressure, double entropy) {
    double atDatum = -MOLAR_GAS_CONSTANT * Math.log(pressure / DATUM_PRESSURE);
    return atTemperaturePressure(
        DATUM_TEMPERATURE * Math.exp((entropy - atDatum) / (gamma * cv)), pressure);
  }

  @Override
  public State atPressureEnthalpy(double pressure, double enthalpy) {
    return atTemperaturePressure(enthalpy / (gamma * cv), pressure);
  }

  @Override
  public double viscosity(State state) {
    return transport().viscosity;
  }

  @Override
  public double thermalConductivity(State state) {
    return transport().conductivity;
  }

  private Transport transport() {
    if (transport == null) {
      throw new OutsideValidity(id + ": an ideal gas has no transport properties of its own");
    }
    return transport;
  }

  @Override
  public double idealCp(double temperature) {
    require("temperature, K", temperature, RANGE.minTemperature(), RANGE.maxTemperature());
    return gamma * cv;
  }

  private void require(String quantity, double value, double low, double high) {
    if (!(value >= low && value <= high)) {
      throw new OutsideValidity(
          String.format(
              Locale.ROOT,
              "%s: %s, is %.6g, outside %.6g to %.6g",
              id,
              quantity,
              value,
              low,
              high));
    }
  }
}
