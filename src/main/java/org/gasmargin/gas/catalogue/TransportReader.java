package org.gasmargin.gas.catalogue;

import java.util.Locale;
import java.util.function.DoubleUnaryOperator;
import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.HelmholtzEquation;
import org.gasmargin.gas.equation.PowerSum;
import org.gasmargin.gas.transport.BatschinskiHildebrand;
import org.gasmargin.gas.transport.CollisionIntegralViscosity;
import org.gasmargin.gas.transport.Conductivity;
import org.gasmargin.gas.transport.ConductivitySum;
import org.gasmargin.gas.transport.DensityPolynomial;
import org.gasmargin.gas.transport.FrictionTheory;
import org.gasmargin.gas.transport.HeliumArpViscosity;
import org.gasmargin.gas.transport.HeliumHandsConductivity;
import org.gasmargin.gas.transport.MethaneFriendConductivity;
import org.gasmargin.gas.transport.MuznyViscosity;
import org.gasmargin.gas.transport.OlchowySengers;
import org.gasmargin.gas.transport.RainwaterFriend;
import org.gasmargin.gas.transport.RatioOfPolynomials;
import org.gasmargin.gas.transport.TemperaturePowers;
import org.gasmargin.gas.transport.Viscosity;
import org.gasmargin.gas.transport.ViscosityAndPowers;
import org.gasmargin.gas.transport.ViscositySum;

/** Reads the transport correlations of one gas. A new kind needs its class and one line here. */
final class TransportReader {
  private final DataNode gas;
  private final HelmholtzEquation equation;

  TransportReader(DataNode gas, HelmholtzEquation equation) {
    this.gas = gas;
    this.equation = equation;
  }

  Viscosity viscosity() {
    DataNode node = gas.node("viscosity");
    return switch (node.text("kind")) {
      case "sum" -> new ViscositySum(diluteViscosity(), initial(node), higher(node.node("higher")));
      case "helium_arp" ->
          new HeliumArpViscosity(
              equation.molarMass(),
              node.number("switch_temperature"),
              node.number("cap_temperature"),
              node.row("dilute", 5),
              node.row("second_order", 5),
              node.row("third_order", 5),
              node.row("fourth_order", 5),
              node.row("hot", 5));
      default -> throw node.unknown("kind");
    };
  }

  private DoubleUnaryOperator diluteViscosity() {
    DataNode sum = gas.node("viscosity");
    DataNode node = sum.node("dilute");
    PowerSum terms = node.powers("terms", 2);
    return switch (node.text("kind")) {
      case "collision_integral" ->
          new CollisionIntegralViscosity(
              node.number("factor"),
              node.number("molar_mass"),
              sum.number("sigma"),
              sum.number("epsilon_over_k"),
              terms);
      case "powers_of_temperature" ->
          new TemperaturePowers(node.number("reducing_temperature"), terms);
      default -> throw node.unknown("kind");
    };
  }

  private static DoubleUnaryOperator initial(DataNode sum) {
    if (!sum.has("initial")) {
      return temperature -> 0;
    }
    DataNode node = sum.node("initial");
    return switch (node.text("kind")) {
      case "rainwater_friend" ->
          new RainwaterFriend(
              node.number("avogadro") * Math.pow(sum.number("sigma"), 3),
              sum.number("epsilon_over_k"),
              node.powers("terms", 2));
      default -> throw node.unknown("kind");
    };
  }

  private ToDoubleFunction<State> higher(DataNode node) {
    double reducingTemperature = node.number("reducing_temperature");
    return switch (node.text("kind")) {
      case "batschinski_hildebrand" ->
          new BatschinskiHildebrand(
              reducingTemperature, node.number("reducing_density"), node.powers("terms", 5));
      case "muzny" ->
          new MuznyViscosity(
              equation.molarMass(),
              reducingTemperature,
              node.number("density_scale"),
              node.row("coefficients", 6));
      case "friction_theory" ->
          new FrictionTheory(
              equation.gasConstant(),
              reducingTemperature,
              node.number("psi1_shift"),
              node.number("psi2_shift"),
              node.nodes("terms").stream().map(TransportReader::frictionTerm).toList());
      default -> throw node.unknown("kind");
    };
  }

  private static FrictionTheory.Term frictionTerm(DataNode node) {
    return new FrictionTheory.Term(
        FrictionTheory.PressurePart.valueOf(node.text("pressure").toUpperCase(Locale.ROOT)),
        (int) node.number("power"),
        node.row("coefficients", 3),
        node.number("exponent"));
  }

  Conductivity conductivity(Viscosity viscosity) {
    DataNode node = gas.node("conductivity");
    return switch (node.text("kind")) {
      case "sum" ->
          new ConductivitySum(
              diluteConductivity(node.node("dilute")),
              densityPolynomial(node.node("residual")),
              olchowySengers(node.node("critical"), viscosity));
      case "helium_hands" ->
          new HeliumHandsConductivity(
              equation.molarMass(),
              node.number("min_temperature"),
              node.number("critical_mass_density"),
              node.row("dilute", 2),
              node.row("dilute_exponents", 4),
              node.row("residual", 11));
      case "methane_friend" -> methaneFriend(node);
      default -> throw node.unknown("kind");
    };
  }

  private DoubleUnaryOperator diluteConductivity(DataNode node) {
    return switch (node.text("kind")) {
      case "viscosity_and_powers" ->
          new ViscosityAndPowers(
              node.number("viscosity_factor"),
              diluteViscosity(),
              equation.reducingTemperature(),
              node.powers("terms", 2));
      case "ratio_of_polynomials" ->
          new RatioOfPolynomials(
              node.number("reducing_temperature"),
              node.powers("numerator", 2),
              node.powers("denominator", 2));
      default -> throw node.unknown("kind");
    };
  }

  private static DensityPolynomial densityPolynomial(DataNode node) {
    return new DensityPolynomial(
        node.number("reducing_temperature"),
        node.number("reducing_density"),
        node.powers("terms", 5));
  }

  private OlchowySengers olchowySengers(DataNode node, Viscosity viscosity) {
    return new OlchowySengers(
        new OlchowySengers.Constants(
            node.number("boltzmann"),
            node.number("amplitude"),
            node.number("nu"),
            node.number("gamma"),
            node.number("fluctuation_amplitude"),
            node.number("correlation_length"),
            node.number("cutoff_wave_number"),
            node.number("reference_temperature"),
            node.number("critical_pressure"),
            node.number("critical_density")),
        equation,
        viscosity);
  }

  private MethaneFriendConductivity methaneFriend(DataNode node) {
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
}
