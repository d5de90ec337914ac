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
import org.gasmargin.gas.transport.Viscosity;

/** Builds one gas from its data file. */
final class GasReader {
  private GasReader() {}

  static Gas read(GasSummary summary) {
    DataNode gas = GasResources.gas(summary.id());
    DataNode equationNode = gas.node("equation");
    DataNode range = equationNode.node("validity");
    HelmholtzEquation equation = EquationReader.read(equationNode, gas.number("molar_mass"));
    FluidLimits limits =
        new FluidLimits(
            summary.id(),
            new ValidityRange(
                range.number("min_temperature"),
                range.number("max_temperature"),
                range.number("max_pressure"),
                range.number("fitted_max_temperature")),
            range.number("max_density"),
            PhaseReader.boundary(gas.node("phases"), equation),
            PhaseReader.melting(gas));
    TransportReader transport = new TransportReader(gas, equation);
    Viscosity viscosity = transport.viscosity();
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
        transport.conductivity(viscosity));
  }

  private static Set<Hazard> hazards(DataNode gas) {
    return gas.texts("hazards").stream()
        .map(text -> Hazard.valueOf(text.toUpperCase(Locale.ROOT)))
        .collect(Collectors.toUnmodifiableSet());
  }
}
