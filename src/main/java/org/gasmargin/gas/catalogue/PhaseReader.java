package org.gasmargin.gas.catalogue;

import java.util.List;
import java.util.Locale;
import org.gasmargin.gas.equation.HelmholtzEquation;
import org.gasmargin.gas.phase.Ancillary;
import org.gasmargin.gas.phase.DewLine;
import org.gasmargin.gas.phase.GasSide;
import org.gasmargin.gas.phase.MeltingLine;
import org.gasmargin.gas.phase.PhaseBoundary;
import org.gasmargin.gas.phase.Saturation;

/** Reads saturation, dew and melting lines. */
final class PhaseReader {
  private PhaseReader() {}

  static PhaseBoundary boundary(DataNode node, HelmholtzEquation equation) {
    return switch (node.text("kind")) {
      case "saturation" ->
          new Saturation(
              equation,
              node.number("critical_temperature"),
              ancillary(node.node("liquid_density")),
              ancillary(node.node("vapour_density")));
      case "dew_line" ->
          new DewLine(
              equation,
              ancillary(node.node("dew_pressure")),
              ancillary(node.node("vapour_density")));
      default -> throw node.unknown("kind");
    };
  }

  /** The same without the liquid: what condenses is refused. */
  static PhaseBoundary gasSide(DataNode node, HelmholtzEquation equation) {
    PhaseBoundary boundary = boundary(node, equation);
    return node.text("kind").equals("saturation")
        ? new GasSide(boundary, node.number("critical_density"))
        : boundary;
  }

  static Ancillary ancillary(DataNode node) {
    return new Ancillary(
        Ancillary.Form.valueOf(node.text("form").toUpperCase(Locale.ROOT)),
        node.number("reducing_temperature"),
        node.number("reducing_value"),
        node.number("max_error_percent") / 100,
        node.powers("terms", 2));
  }

  static List<MeltingLine> melting(DataNode gas) {
    return gas.nodes("melting").stream().map(PhaseReader::meltingLine).toList();
  }

  private static MeltingLine meltingLine(DataNode node) {
    boolean relative =
        switch (node.text("form")) {
          case "relative" -> true;
          case "absolute" -> false;
          default -> throw node.unknown("form");
        };
    return new MeltingLine(
        node.number("reference_temperature"),
        node.number("reference_pressure"),
        relative,
        node.number("min_temperature"),
        node.number("max_temperature"),
        node.powers("terms", 2));
  }
}
