package org.gasmargin.gas.helmholtz;

import java.util.Set;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.Hazard;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.gas.ValidityRange;
import org.gasmargin.gas.equation.EquationPoint;
import org.gasmargin.gas.equation.HelmholtzEquation;
import org.gasmargin.gas.transport.Conductivity;
import org.gasmargin.gas.transport.Viscosity;

/**
 * A gas whose equilibrium properties all follow from one Helmholtz-energy equation of state.
 * Compressed liquid is a single phase and is given; states between gas and liquid, solid, or out of
 * range are refused.
 */
public final class HelmholtzGas implements Gas {
  /**
   * What a gas is called and where its equation comes from.
   *
   * @param id identifier
   * @param name name for people
   * @param hazards general hazards
   * @param citation citation of the equation of state
   * @param uncertainty uncertainty of the equation, in words
   */
  public record Identity(
      String id, String name, Set<Hazard> hazards, String citation, String uncertainty) {
    /** Copies the set. */
    public Identity {
      hazards = Set.copyOf(hazards);
    }
  }

  private final Identity identity;
  private final HelmholtzEquation equation;
  private final FluidLimits limits;
  private final Viscosity viscosity;
  private final Conductivity conductivity;
  private final DensitySearch densities;
  private final StateSearch search;

  /** Puts a gas together from its parts. */
  public HelmholtzGas(
      Identity identity,
      HelmholtzEquation equation,
      FluidLimits limits,
      Viscosity viscosity,
      Conductivity conductivity) {
    this.identity = identity;
    this.equation = equation;
    this.limits = limits;
    this.viscosity = viscosity;
    this.conductivity = conductivity;
    densities = new DensitySearch(equation, limits);
    search = new StateSearch(equation, limits, densities);
  }

  @Override
  public String id() {
    return identity.id();
  }

  @Override
  public String name() {
    return identity.name();
  }

  @Override
  public double molarMass() {
    return equation.molarMass();
  }

  @Override
  public ValidityRange validity() {
    return limits.range();
  }

  @Override
  public Set<Hazard> hazards() {
    return identity.hazards();
  }

  @Override
  public String citation() {
    return identity.citation();
  }

  /** Uncertainty of the equation of state in words, as its data file states it. */
  public String uncertainty() {
    return identity.uncertainty();
  }

  @Override
  public State at(double temperature, double molarDensity) {
    limits.requireTemperature(temperature);
    limits.requireDensity(molarDensity);
    return limits.accept(equation.newPoint().moveTo(temperature, molarDensity));
  }

  @Override
  public State atTemperaturePressure(double temperature, double pressure) {
    limits.requireTemperature(temperature);
    limits.requirePressure(pressure);
    EquationPoint point = equation.newPoint();
    densities.move(point, temperature, pressure);
    return limits.accept(point);
  }

  @Override
  public State atDensityEnergy(
      double molarDensity, double internalEnergy, double temperatureGuess) {
    limits.requireFinite("internal energy", internalEnergy);
    limits.requireDensity(molarDensity);
    return search.atDensity(
        molarDensity, FixedDensity.Property.ENERGY, internalEnergy, temperatureGuess);
  }

  @Override
  public State atDensityPressure(double molarDensity, double pressure) {
    limits.requireDensity(molarDensity);
    limits.requirePressure(pressure);
    double guess = pressure / (molarDensity * equation.gasConstant());
    return search.atDensity(molarDensity, FixedDensity.Property.PRESSURE, pressure, guess);
  }

  @Override
  public State atDensityEntropy(double molarDensity, double entropy) {
    limits.requireFinite("entropy", entropy);
    limits.requireDensity(molarDensity);
    double guess = search.usualTemperature();
    return search.atDensity(molarDensity, FixedDensity.Property.ENTROPY, entropy, guess);
  }

  @Override
  public State atPressureEntropy(double pressure, double entropy) {
    limits.requirePressure(pressure);
    limits.requireFinite("entropy", entropy);
    return search.atPressure(pressure, FixedPressure.Property.ENTROPY, entropy);
  }

  @Override
  public State atPressureEnthalpy(double pressure, double enthalpy) {
    limits.requirePressure(pressure);
    limits.requireFinite("enthalpy", enthalpy);
    return search.atPressure(pressure, FixedPressure.Property.ENTHALPY, enthalpy);
  }

  @Override
  public double viscosity(State state) {
    return usable("viscosity", viscosity.at(state));
  }

  @Override
  public double thermalConductivity(State state) {
    return usable("thermal conductivity", conductivity.at(state));
  }

  @Override
  public double idealCp(double temperature) {
    limits.requireTemperature(temperature);
    return equation.idealCp(temperature);
  }

  private double usable(String quantity, double value) {
    if (!(value > 0 && Double.isFinite(value))) {
      throw new OutsideValidity(
          limits.name() + ": the correlation of the " + quantity + " does not reach this state");
    }
    return value;
  }
}
