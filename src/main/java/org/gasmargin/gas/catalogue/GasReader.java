package org.gasmargin.gas.catalogue;

import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.Hazard;
import org.gasmargin.gas.ValidityRange;
import org.gasmargin.gas.equation.HelmholtzEquation;
import org.gasmargin.gas.helmholtz.FluidLimits;
import org.gasmargin.gas.helmholtz.HelmholtzGas;
import org.gasmargin.gas.phase.PhaseBoundary;
import org.gasmargin.gas.transport.Viscosity;

/** Builds one gas from its data file. */
final class GasReader {
  private GasReader() {}

  /** Which phases the gas may take. */
  @FunctionalInterface
  interface Phases {
    PhaseBoundary read(DataNode node, HelmholtzEquation equation);
  }

  static Gas read(GasSummary summary, Phases phases) {
    DataNode gas = GasResources.gas(summary.id());
    DataNode equationNode = gas.node("equation");
    DataNode range = equationNode.node("validity");
    HelmholtzEquation equation = EquationReader.read(equationNode, gas.number("molar_mass"));
    String name = summary.id().replace('_', ' ');
    FluidLimits limits =
        new FluidLimits(
            name,
            new ValidityRange(
                range.number("min_temperature"),
                range.number("max_temperature"),
                range.number("max_pressure"),
                range.number("fitted_max_temperature")),
            range.number("max_density"),
            phases.read(gas.node("phases"), equation),
            PhaseReader.melting(gas));
    ViscosityReader viscosities = new ViscosityReader(gas, equation);
    Viscosity viscosity = viscosities.read(name);
    return new HelmholtzGas(
        new HelmholtzGas.Identity(
            summary.id(),
            summary.name(),
            hazards(gas),
            equationNode.text("citation"),
            equationNode.text("uncertainty")),
        equation,
        limits,
        viscosity,
        new ConductivityReader(gas, equation, viscosities).read(name, viscosity));
  }

  private static Set<Hazard> hazards(DataNode gas) {
    return gas.texts("hazards").stream()
        .map(text -> Hazard.valueOf(text.toUpperCase(Locale.ROOT)))
        .collect(Collectors.toUnmodifiableSet());
  }
}
