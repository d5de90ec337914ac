package org.gasmargin.gas.catalogue;

import java.util.function.DoubleUnaryOperator;
import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.HelmholtzEquation;
import org.gasmargin.gas.transport.AmmoniaTufeu;
import org.gasmargin.gas.transport.Conductivity;
import org.gasmargin.gas.transport.ConductivitySum;
import org.gasmargin.gas.transport.DensityPolynomial;
import org.gasmargin.gas.transport.EthaneFriendDilute;
import org.gasmargin.gas.transport.HeliumHandsConductivity;
import org.gasmargin.gas.transport.MethaneFriendConductivity;
import org.gasmargin.gas.transport.NoCorrelation;
import org.gasmargin.gas.transport.OlchowySengers;
import org.gasmargin.gas.transport.RatioOfPolynomials;
import org.gasmargin.gas.transport.RootOverPolynomial;
import org.gasmargin.gas.transport.Viscosity;
import org.gasmargin.gas.transport.ViscosityAndPowers;
import org.gasmargin.gas.transport.WaterCorrelationLength;
import org.gasmargin.gas.transport.WaterIapwsConductivity;

/** Reads the thermal conductivity of one gas. A new kind needs its class and one line here. */
final class ConductivityReader {
  private final DataNode gas;
  private final DataNode node;
  private final HelmholtzEquation equation;
  private final ViscosityReader viscosities;

  ConductivityReader(DataNode gas, HelmholtzEquation equation, ViscosityReader viscosities) {
    this.gas = gas;
    this.node = gas.node("conductivity");
    this.equation = equation;
    this.viscosities = viscosities;
  }

  Conductivity read(String gasName, Viscosity viscosity) {
    return switch (node.text("kind")) {
      case "sum" ->
          new ConductivitySum(
              dilute(node.node("dilute")),
              densityPolynomial(node.node("residual")),
              critical(node.node("critical"), viscosity));
      case "helium_hands" ->
          new HeliumHandsConductivity(
              equation.molarMass(),
              node.number("min_temperature"),
              node.number("critical_mass_density"),
              node.row("dilute", 2),
              node.row("dilute_exponents", 4),
              node.row("residual", 11));
      case "methane_friend" -> methaneFriend();
      case "water_iapws" -> waterIapws(viscosity);
      case "none" -> new NoCorrelation(gasName, "thermal conductivity");
      default -> throw node.unknown("kind");
    };
  }

  private DoubleUnaryOperator dilute(DataNode dilute) {
    return switch (dilute.text("kind")) {
      case "viscosity_and_powers" ->
          new ViscosityAndPowers(
              dilute.number("viscosity_factor"),
              viscosities.dilute(),
              equation.reducingTemperature(),
              dilute.powers("terms", 2));
      case "ratio_of_polynomials" ->
          new RatioOfPolynomials(
              dilute.number("reducing_temperature"),
              dilute.powers("numerator", 2),
              dilute.powers("denominator", 2));
      case "root_over_polynomial" ->
          new RootOverPolynomial(dilute.number("reducing_temperature"), dilute.powers("terms", 2));
      case "ethane_friend" ->
          new EthaneFriendDilute(
              dilute.number("factor"),
              dilute.number("epsilon_over_k"),
              dilute.number("reducing_temperature"),
              dilute.row("internal", 2),
              viscosities.dilute(),
              equation);
      default -> throw dilute.unknown("kind");
    };
  }

  private static DensityPolynomial densityPolynomial(DataNode residual) {
    return new DensityPolynomial(
        residual.number("reducing_temperature"),
        residual.number("reducing_density"),
        residual.powers("terms", 5));
  }

  private ToDoubleFunction<State> critical(DataNode critical, Viscosity viscosity) {
    return switch (critical.text("kind")) {
      case "olchowy_sengers" -> olchowySengers(critical, viscosity);
      case "tufeu" ->
          new AmmoniaTufeu(
              equation.molarMass(),
              critical.number("critical_temperature"),
              critical.number("critical_mass_density"),
              critical.number("amplitude"),
              critical.number("nu"),
              critical.number("gamma"),
              critical.number("correction_exponent"),
              critical.number("correlation_length"),
              critical.number("correction_amplitude"),
              critical.number("fluctuation_amplitude"),
              critical.number("boltzmann"));
      default -> throw critical.unknown("kind");
    };
  }

  private OlchowySengers olchowySengers(DataNode critical, Viscosity viscosity) {
    return new OlchowySengers(
        new OlchowySengers.Constants(
            critical.number("boltzmann"),
            critical.number("amplitude"),
            critical.number("nu"),
            critical.number("gamma"),
            critical.number("fluctuation_amplitude"),
            critical.number("correlation_length"),
            critical.number("cutoff_wave_number"),
            critical.number("reference_temperature"),
            critical.number("critical_pressure"),
            critical.number("critical_density")),
        equation,
        viscosity);
  }

  private MethaneFriendConductivity methaneFriend() {
    DataNode dilute = node.node("dilute_viscosity");
    DataNode excess = node.node("excess_viscosity");
    DataNode residual = node.node("residual");
    DataNode critical = node.node("critical");
    DataNode phases = gas.node("phases");
    return new MethaneFriendConductivity(
        new MethaneFriendConductivity.Coefficients(
            node.number("reducing_temperature"),
            node.number("reducing_density"),
            dilute.number("factor"),
            dilute.number("epsilon_over_k"),
            dilute.powers("terms", 2),
            excess.number("factor"),
            excess.powers("numerator", 3),
            excess.powers("denominator", 3),
            node.node("dilute").number("factor"),
            node.node("dilute").row("internal", 2),
            residual.number("factor"),
            residual.powers("terms", 3),
            residual.number("saturation"),
            critical.number("factor"),
            critical.number("amplitude"),
            critical.number("power"),
            critical.row("decay", 3)),
        equation,
        phases.number("critical_temperature"),
        phases.number("critical_density"),
        PhaseReader.ancillary(phases.node("vapour_density")));
  }

  private Conductivity waterIapws(Viscosity viscosity) {
    DataNode critical = node.node("critical");
    return new WaterIapwsConductivity(
        equation.molarMass(),
        node.number("reducing_temperature"),
        node.number("reducing_mass_density"),
        node.powers("dilute", 2),
        node.powers("residual", 3),
        waterLength(node, equation),
        critical.number("amplitude"),
        critical.number("cutoff"),
        critical.number("mass_gas_constant"),
        critical.number("least_y"),
        viscosity);
  }

  /** The correlation length that both formulations of water use, from the node of either. */
  static WaterCorrelationLength waterLength(DataNode node, HelmholtzEquation equation) {
    DataNode critical = node.node("critical");
    return new WaterCorrelationLength(
        equation,
        node.number("reducing_temperature"),
        node.number("reducing_mass_density") / equation.molarMass(),
        node.number("reducing_pressure"),
        critical.number("reference_temperature"),
        critical.number("nu"),
        critical.number("gamma"),
        critical.number("correlation_length"),
        critical.number("fluctuation_amplitude"));
  }
}
