package org.gasmargin.gas.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.EquationPoint;
import org.gasmargin.gas.equation.HelmholtzEquation;
import org.gasmargin.gas.phase.PhaseBoundary;
import org.gasmargin.gas.phase.PhaseEnds;
import org.junit.jupiter.api.Assertions;

/** States between gas and liquid are refused whichever way they are asked for. */
class PhaseProperties {
  /** A gas with the parts that it is made of. */
  record Parts(Gas gas, HelmholtzEquation equation, PhaseBoundary phases, double maxDensity) {
    static Parts of(GasSummary summary) {
      DataNode data = GasResources.gas(summary.id());
      DataNode equationNode = data.node("equation");
      HelmholtzEquation equation = EquationReader.read(equationNode, data.number("molar_mass"));
      return new Parts(
          GasReader.read(summary, PhaseReader::boundary),
          equation,
          PhaseReader.boundary(data.node("phases"), equation),
          equationNode.node("validity").number("max_density"));
    }

    double temperature(double share) {
      double low = gas.validity().minTemperature();
      return low + share * (phases.gapCloses() - low);
    }

    @Override
    public String toString() {
      return gas.id();
    }
  }

  private static final GasCatalogue CATALOGUE = new GasCatalogue();

  private static final Map<String, Parts> ALL =
      CATALOGUE.list().stream().collect(Collectors.toMap(GasSummary::id, Parts::of));

  @Provide
  Arbitrary<Parts> all() {
    return Arbitraries.of(ALL.keySet().stream().sorted().toList()).map(PhaseProperties::parts);
  }

  @Provide
  Arbitrary<Parts> pure() {
    return all().filter(parts -> !parts.gas().id().equals("air"));
  }

  private static Parts parts(String id) {
    Parts parts = ALL.get(id);
    Assertions.assertNotNull(parts, id);
    return parts;
  }

  @Property(tries = 500)
  void mixturesOfGasAndLiquidAreRefused(
      @ForAll("pure") Parts parts,
      @ForAll @DoubleRange(min = 0.001, max = 0.9995) @Scale(9) double temperatureShare,
      @ForAll @DoubleRange(min = 0.01, max = 0.99) @Scale(9) double quality) {
    Gas gas = parts.gas();
    double t = parts.temperature(temperatureShare);
    PhaseEnds ends = parts.phases().endsAt(t);
    State vapour = gas.at(t, ends.vapourDensity() * (1 - 1e-9));
    State liquid = gas.at(t, ends.liquidDensity() * (1 + 1e-9));
    double rho = 1 / (quality / vapour.molarDensity() + (1 - quality) / liquid.molarDensity());
    double p = ends.vapourPressure();
    double u = quality * vapour.internalEnergy() + (1 - quality) * liquid.internalEnergy();
    double h = quality * vapour.enthalpy() + (1 - quality) * liquid.enthalpy();
    double s = quality * vapour.entropy() + (1 - quality) * liquid.entropy();
    assertCondenses(() -> gas.at(t, rho));
    for (double guess : new double[] {t, 300, gas.validity().maxTemperature()}) {
      assertCondenses(() -> gas.atDensityEnergy(rho, u, guess));
    }
    assertCondenses(() -> gas.atDensityPressure(rho, p));
    assertCondenses(() -> gas.atDensityEntropy(rho, s));
    assertCondenses(() -> gas.atPressureEntropy(p, s));
    assertCondenses(() -> gas.atPressureEnthalpy(p, h));
  }

  private static void assertCondenses(org.junit.jupiter.api.function.Executable way) {
    OutsideValidity refusal = assertThrows(OutsideValidity.class, way);
    assertTrue(refusal.toString().contains("would begin to condense"), refusal.toString());
  }

  @Property(tries = 500)
  void theGapEndsExactlyAtSaturation(
      @ForAll("pure") Parts parts,
      @ForAll @DoubleRange(min = 0.001, max = 0.9995) @Scale(9) double temperatureShare) {
    Gas gas = parts.gas();
    double t = parts.temperature(temperatureShare);
    PhaseEnds ends = parts.phases().endsAt(t);
    double hair = 1e-8;
    State vapour = gas.at(t, ends.vapourDensity() * (1 - hair));
    State liquid = gas.at(t, ends.liquidDensity() * (1 + hair));
    assertCondenses(() -> gas.at(t, ends.vapourDensity() * (1 + hair)));
    assertCondenses(() -> gas.at(t, ends.liquidDensity() * (1 - hair)));
    // Equal pressure and equal Gibbs energy on both sides.
    double rt = parts.equation().gasConstant() * t;
    double gibbsVapour = vapour.enthalpy() - t * vapour.entropy();
    double gibbsLiquid = liquid.enthalpy() - t * liquid.entropy();
    double byTheHair = hair * (vapour.dpdRho() + liquid.dpdRho());
    assertEquals(gibbsVapour, gibbsLiquid, 1e-6 * rt + byTheHair);
    assertEquals(vapour.pressure(), ends.vapourPressure(), 1e-6 * ends.vapourPressure());
  }

  /** Gas alone is the same gas up to saturation and refuses the liquid, saturated or compressed. */
  @Property(tries = 300)
  void gasAloneRefusesEveryLiquid(
      @ForAll("pure") Parts parts,
      @ForAll @DoubleRange(min = 0.001, max = 0.9995) @Scale(9) double temperatureShare,
      @ForAll @DoubleRange(min = 1e-5, max = 1) @Scale(9) double densityShare) {
    Gas gas = CATALOGUE.findGas(parts.gas().id()).orElseThrow();
    double t = parts.temperature(temperatureShare);
    PhaseEnds ends = parts.phases().endsAt(t);
    double thin = ends.vapourDensity() * (1 - 1e-8) * Math.pow(1e-3, densityShare);
    assertEquals(parts.gas().at(t, thin), gas.at(t, thin));
    double dense =
        ends.liquidDensity() + densityShare * (parts.maxDensity() - ends.liquidDensity());
    assertCondenses(() -> gas.at(t, dense));
    State liquid;
    try {
      liquid = parts.gas().at(t, dense);
    } catch (OutsideValidity solidOrOutOfRange) {
      return;
    }
    double p = liquid.pressure();
    assertCondenses(() -> gas.atTemperaturePressure(t, p));
    assertCondenses(() -> gas.atDensityEnergy(dense, liquid.internalEnergy(), t));
    assertCondenses(() -> gas.atDensityEntropy(dense, liquid.entropy()));
    assertCondenses(() -> gas.atPressureEntropy(p, liquid.entropy()));
    assertCondenses(() -> gas.atPressureEnthalpy(p, liquid.enthalpy()));
  }

  /** Air: gas is accepted below the guard and nothing above it, be it dense or liquid. */
  @Property(tries = 200)
  void airIsRefusedFromJustBelowItsDewPressure(
      @ForAll @DoubleRange(max = 0.99999) @Scale(9) double temperatureShare,
      @ForAll @DoubleRange(min = 1.0001, max = 50) @Scale(9) double factor) {
    Parts air = parts("air");
    double t = air.temperature(temperatureShare);
    PhaseEnds ends = air.phases().endsAt(t);
    double below = ends.vapourPressure() * (1 - 1e-6);
    assertEquals(below, air.gas().atTemperaturePressure(t, below).pressure(), 1e-9 * below);
    assertCondenses(() -> air.gas().atTemperaturePressure(t, factor * ends.vapourPressure()));
    double dense = ends.vapourDensity() * factor;
    if (dense < air.maxDensity()) {
      assertCondenses(() -> air.gas().at(t, dense));
    }
  }

  /**
   * Brute force as witness: the density found is the end of a branch on which the pressure rises
   * without a fall from zero density (gas) or to the highest density (liquid), and of the two it
   * has the lower Gibbs energy. What lies between is an artefact of the equation inside the gap.
   */
  @Property(tries = 500)
  void theDensityFoundIsTheStableOne(
      @ForAll("pure") Parts parts,
      @ForAll @DoubleRange(max = 1) @Scale(9) double temperatureShare,
      @ForAll @DoubleRange(max = 1) @Scale(9) double pressureShare) {
    Gas gas = parts.gas();
    double low = gas.validity().minTemperature();
    double t = low * Math.pow(20, temperatureShare);
    double p = Math.pow(gas.validity().maxPressure(), pressureShare);
    State found;
    try {
      found = gas.atTemperaturePressure(t, p);
    } catch (OutsideValidity refusal) {
      assertTrue(
          refusal.toString().contains("is solid")
              || refusal.toString().contains("outside the range"),
          refusal.toString());
      return;
    }
    double gibbs = found.enthalpy() - t * found.entropy();
    double rt = parts.equation().gasConstant() * t;
    List<Double> candidates = branchEnds(parts, t, p);
    assertTrue(
        candidates.stream().anyMatch(rho -> Math.abs(rho / found.molarDensity() - 1) < 1e-6),
        () -> found + " not among " + candidates);
    EquationPoint point = parts.equation().newPoint();
    for (double rho : candidates) {
      point.moveTo(t, rho);
      assertTrue(point.enthalpy() - t * point.entropy() >= gibbs - 1e-8 * rt);
    }
  }

  /** Densities where the pressure reaches p on the gas branch and on the liquid branch. */
  private static List<Double> branchEnds(Parts parts, double t, double p) {
    EquationPoint point = parts.equation().newPoint();
    double[] grid = new double[4001];
    double[] pressures = new double[grid.length];
    for (int i = 0; i < grid.length; i++) {
      grid[i] = 1e-8 * Math.pow(parts.maxDensity() / 1e-8, i / (grid.length - 1.0));
      pressures[i] = point.moveTo(t, grid[i]).pressure();
    }
    List<Double> ends = new ArrayList<>();
    for (int i = 1; i < grid.length && pressures[i] > pressures[i - 1]; i++) {
      if (pressures[i - 1] < p && pressures[i] >= p) {
        ends.add(bisect(point, t, p, grid[i - 1], grid[i]));
      }
    }
    for (int i = grid.length - 1; i > 0 && pressures[i] > pressures[i - 1]; i--) {
      if (pressures[i - 1] < p && pressures[i] >= p) {
        ends.add(bisect(point, t, p, grid[i - 1], grid[i]));
      }
    }
    return ends;
  }

  private static double bisect(EquationPoint point, double t, double p, double from, double to) {
    double low = from;
    double high = to;
    for (int i = 0; i < 60; i++) {
      double middle = 0.5 * (low + high);
      if (point.moveTo(t, middle).pressure() < p) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return high;
  }
}
