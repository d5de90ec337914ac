package org.gasmargin.gas.catalogue;

import java.util.Locale;
import java.util.function.DoubleUnaryOperator;
import java.util.function.ToDoubleFunction;
import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.HelmholtzEquation;
import org.gasmargin.gas.transport.BatschinskiHildebrand;
import org.gasmargin.gas.transport.CollisionIntegralViscosity;
import org.gasmargin.gas.transport.FreeVolume;
import org.gasmargin.gas.transport.FrictionTheory;
import org.gasmargin.gas.transport.HeliumArpViscosity;
import org.gasmargin.gas.transport.LaeseckeMuznyDense;
import org.gasmargin.gas.transport.LaeseckeMuznyDilute;
import org.gasmargin.gas.transport.MuznyViscosity;
import org.gasmargin.gas.transport.NoCorrelation;
import org.gasmargin.gas.transport.RainwaterFriend;
import org.gasmargin.gas.transport.RatioOfDensitySums;
import org.gasmargin.gas.transport.RootOverPowers;
import org.gasmargin.gas.transport.RootTimesThirds;
import org.gasmargin.gas.transport.TemperaturePowers;
import org.gasmargin.gas.transport.Viscosity;
import org.gasmargin.gas.transport.ViscositySum;
import org.gasmargin.gas.transport.WaterIapwsViscosity;

/** Reads the viscosity of one gas. A new kind needs its class and one line here. */
final class ViscosityReader {
  private final DataNode node;
  private final HelmholtzEquation equation;

  ViscosityReader(DataNode gas, HelmholtzEquation equation) {
    this.node = gas.node("viscosity");
    this.equation = equation;
  }

  Viscosity read(String gasName) {
    return switch (node.text("kind")) {
      case "sum" -> new ViscositySum(dilute(), initial(), higher(node.node("higher")));
      case "helium_arp" -> heliumArp();
      case "water_iapws" -> waterIapws();
      case "none" -> new NoCorrelation(gasName, "viscosity");
      default -> throw node.unknown("kind");
    };
  }

  private Viscosity heliumArp() {
    return new HeliumArpViscosity(
        equation.molarMass(),
        node.number("switch_temperature"),
        node.number("cap_temperature"),
        node.row("dilute", 5),
        node.row("second_order", 5),
        node.row("third_order", 5),
        node.row("fourth_order", 5),
        node.row("hot", 5));
  }

  private Viscosity waterIapws() {
    DataNode critical = node.node("critical");
    return new WaterIapwsViscosity(
        equation.molarMass(),
        node.number("reducing_temperature"),
        node.number("reducing_mass_density"),
        node.powers("dilute", 2),
        node.powers("residual", 3),
        ConductivityReader.waterLength(node, equation),
        critical.number("exponent"),
        critical.number("cutoff_c"),
        critical.number("cutoff_d"),
        critical.number("switch_length"));
  }

  /** Viscosity of the dilute gas, Pa s, of T, K. */
  DoubleUnaryOperator dilute() {
    DataNode dilute = node.node("dilute");
    return switch (dilute.text("kind")) {
      case "collision_integral" ->
          new CollisionIntegralViscosity(
              dilute.number("factor"),
              dilute.number("molar_mass"),
              node.number("sigma"),
              node.number("epsilon_over_k"),
              dilute.powers("terms", 2));
      case "powers_of_temperature" ->
          new TemperaturePowers(dilute.number("reducing_temperature"), dilute.powers("terms", 2));
      case "root_over_powers" ->
          new RootOverPowers(
              dilute.number("factor"),
              dilute.number("reducing_temperature"),
              dilute.powers("terms", 2));
      case "root_times_thirds" ->
          new RootTimesThirds(
              dilute.number("factor"), node.number("epsilon_over_k"), dilute.powers("terms", 2));
      case "laesecke_muzny" ->
          new LaeseckeMuznyDilute(dilute.number("factor"), dilute.row("coefficients", 7));
      default -> throw dilute.unknown("kind");
    };
  }

  private DoubleUnaryOperator initial() {
    if (!node.has("initial")) {
      return temperature -> 0;
    }
    DataNode initial = node.node("initial");
    return switch (initial.text("kind")) {
      case "rainwater_friend" ->
          new RainwaterFriend(
              initial.number("avogadro") * Math.pow(node.number("sigma"), 3),
              node.number("epsilon_over_k"),
              initial.powers("terms", 2));
      default -> throw initial.unknown("kind");
    };
  }

  private ToDoubleFunction<State> higher(DataNode higher) {
    return switch (higher.text("kind")) {
      case "batschinski_hildebrand" -> batschinskiHildebrand(higher);
      case "muzny" ->
          new MuznyViscosity(
              equation.molarMass(),
              higher.number("reducing_temperature"),
              higher.number("density_scale"),
              higher.row("coefficients", 6));
      case "friction_theory" ->
          new FrictionTheory(
              equation.gasConstant(),
              higher.number("reducing_temperature"),
              higher.number("psi1_shift"),
              higher.number("psi2_shift"),
              higher.nodes("terms").stream().map(ViscosityReader::frictionTerm).toList());
      case "friend_ratio" ->
          new RatioOfDensitySums(
              higher.number("factor"),
              higher.number("reducing_temperature"),
              higher.number("reducing_density"),
              higher.powers("numerator", 3),
              higher.powers("denominator", 3));
      case "laesecke_muzny" ->
          new LaeseckeMuznyDense(
              equation.gasConstant(),
              equation.molarMass(),
              higher.number("triple_temperature"),
              higher.number("triple_liquid_mass_density"),
              higher.number("reduction"),
              higher.number("c1"),
              higher.number("c2"),
              higher.number("gamma"));
      default -> throw higher.unknown("kind");
    };
  }

  private static ToDoubleFunction<State> batschinskiHildebrand(DataNode higher) {
    double reducingTemperature = higher.number("reducing_temperature");
    double reducingDensity = higher.number("reducing_density");
    ToDoubleFunction<State> polynomial =
        new BatschinskiHildebrand(reducingTemperature, reducingDensity, higher.powers("terms", 5));
    if (!higher.has("free_volume")) {
      return polynomial;
    }
    DataNode node = higher.node("free_volume");
    ToDoubleFunction<State> freeVolume =
        new FreeVolume(
            reducingTemperature,
            reducingDensity,
            node.powers("numerator", 3),
            node.powers("close_packing", 2));
    return state -> polynomial.applyAsDouble(state) + freeVolume.applyAsDouble(state);
  }

  private static FrictionTheory.Term frictionTerm(DataNode node) {
    return new FrictionTheory.Term(
        FrictionTheory.PressurePart.valueOf(node.text("pressure").toUpperCase(Locale.ROOT)),
        (int) node.number("power"),
        node.row("coefficients", 3),
        node.number("exponent"));
  }
}
