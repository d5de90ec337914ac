package org.gasmargin.gas.catalogue;

import java.util.Arrays;
import java.util.stream.Stream;
import org.gasmargin.gas.equation.GaoTerms;
import org.gasmargin.gas.equation.GaussianTerms;
import org.gasmargin.gas.equation.HelmholtzEquation;
import org.gasmargin.gas.equation.IdealPowerTerms;
import org.gasmargin.gas.equation.IdealTerms;
import org.gasmargin.gas.equation.LeadTerm;
import org.gasmargin.gas.equation.LogTauTerm;
import org.gasmargin.gas.equation.NonAnalyticTerms;
import org.gasmargin.gas.equation.PlanckEinsteinGeneralTerms;
import org.gasmargin.gas.equation.PlanckEinsteinTerms;
import org.gasmargin.gas.equation.PowerExponentialTerms;
import org.gasmargin.gas.equation.ResidualTerms;

/** Reads an equation of state. A new kind of term needs its class and one line here. */
final class EquationReader {
  private EquationReader() {}

  static HelmholtzEquation read(DataNode equation, double molarMass) {
    return new HelmholtzEquation(
        equation.number("gas_constant"),
        molarMass,
        equation.number("reducing_temperature"),
        equation.number("reducing_density"),
        equation.nodes("ideal").stream().map(EquationReader::ideal).toList(),
        equation.nodes("residual").stream().map(EquationReader::residual).toList());
  }

  private static IdealTerms ideal(DataNode node) {
    return switch (node.text("kind")) {
      case "lead" -> new LeadTerm(node.number("a1"), node.number("a2"));
      case "log_tau" -> new LogTauTerm(node.number("a"));
      case "power" ->
          new IdealPowerTerms(
              rows(node, 2).map(r -> new IdealPowerTerms.Term(r[0], r[1])).toList());
      case "planck_einstein" ->
          new PlanckEinsteinTerms(
              rows(node, 2).map(r -> new PlanckEinsteinTerms.Term(r[0], r[1])).toList());
      case "planck_einstein_general" ->
          new PlanckEinsteinGeneralTerms(
              rows(node, 4)
                  .map(r -> new PlanckEinsteinGeneralTerms.Term(r[0], r[1], r[2], r[3]))
                  .toList());
      default -> throw node.unknown("kind");
    };
  }

  private static ResidualTerms residual(DataNode node) {
    return switch (node.text("kind")) {
      case "power_exponential" ->
          new PowerExponentialTerms(
              rows(node, 4)
                  .map(r -> new PowerExponentialTerms.Term(r[0], r[1], r[2], (int) r[3]))
                  .toList());
      case "gaussian" ->
          new GaussianTerms(
              rows(node, 7)
                  .map(r -> new GaussianTerms.Term(r[0], r[1], r[2], r[3], r[4], r[5], r[6]))
                  .toList());
      case "gao" ->
          new GaoTerms(
              rows(node, 8)
                  .map(r -> new GaoTerms.Term(r[0], r[1], r[2], r[3], r[4], r[5], r[6], r[7]))
                  .toList());
      case "non_analytic" ->
          new NonAnalyticTerms(
              rows(node, 8)
                  .map(
                      r ->
                          new NonAnalyticTerms.Term(r[0], r[1], r[2], r[3], r[4], r[5], r[6], r[7]))
                  .toList());
      default -> throw node.unknown("kind");
    };
  }

  private static Stream<double[]> rows(DataNode node, int columns) {
    return Arrays.stream(node.rows("terms", columns));
  }
}
