package org.gasmargin.gas.helmholtz;

import java.util.Locale;
import java.util.Optional;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.Provide;
import net.jqwik.api.domains.DomainContextBase;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.gas.catalogue.GasSummary;

/** Gases of the catalogue and states over their whole range, from 1 Pa to the highest pressure. */
public class AnyState extends DomainContextBase {
  private static final GasCatalogue CATALOGUE = new GasCatalogue();

  /** A gas with one of its stable states. */
  public record GasState(Gas gas, State state) {
    @Override
    public String toString() {
      return String.format(
          Locale.ROOT,
          "%s at %.9g K, %.9g Pa, %.9g mol/m3",
          gas.id(),
          state.temperature(),
          state.pressure(),
          state.molarDensity());
    }
  }

  /** Any gas of the catalogue. */
  @Provide
  public Arbitrary<Gas> gases() {
    return Arbitraries.of(CATALOGUE.list().stream().map(GasSummary::id).toList())
        .map(id -> CATALOGUE.find(id).orElseThrow());
  }

  /** Any stable state: temperature and pressure spread over their logarithms. */
  @Provide
  public Arbitrary<GasState> states() {
    Arbitrary<Double> shares = Arbitraries.doubles().between(0, 1).ofScale(9);
    return Combinators.combine(gases(), shares, shares)
        .as(AnyState::stateAt)
        .filter(Optional::isPresent)
        .map(Optional::orElseThrow);
  }

  private static Optional<GasState> stateAt(
      Gas gas, double temperatureShare, double pressureShare) {
    double low = gas.validity().minTemperature();
    double high = gas.validity().maxTemperature();
    double temperature = low * Math.pow(high / low, temperatureShare);
    double pressure = Math.pow(gas.validity().maxPressure(), pressureShare);
    try {
      return Optional.of(new GasState(gas, gas.atTemperaturePressure(temperature, pressure)));
    } catch (OutsideValidity refusal) {
      return Optional.empty();
    }
  }
}
