package org.gasmargin.process.modelled;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;
import org.junit.jupiter.api.Test;

/**
 * Two cases of the wall benchmarks solved again in another way: other unknowns, an even grid with
 * extrapolation to no cell size, and the explicit integrator of Commons Math. Status: computed by
 * an independent implementation.
 */
class ExplicitWitnessTest {
  private static final Gas NITROGEN = new GasCatalogue().find("nitrogen").orElseThrow();

  /** A slab of steel in even cells, per m2 of area. */
  private record Slab(double thickness, double inside, double outside, double ambient) {
    private static final double CONDUCTIVITY = 45;
    private static final double CAPACITY = 7850 * 470;

    double surface(double gas, double[] y, int cells) {
      double half = 2 * CONDUCTIVITY * cells / thickness;
      return (inside * gas + half * y[y.length - cells]) / (inside + half);
    }

    /** Sets the rates of the last {@code cells} entries; gives the flux into the wall, W/m2. */
    double rates(double gas, double[] y, double[] rates, int cells) {
      double width = thickness / cells;
      int first = y.length - cells;
      double entering = inside * (gas - surface(gas, y, cells));
      double flux = entering;
      for (int i = first; i < y.length; i++) {
        double leaving =
            i + 1 < y.length
                ? CONDUCTIVITY / width * (y[i] - y[i + 1])
                : (y[i] - ambient) / (1 / outside + width / (2 * CONDUCTIVITY));
        rates[i] = (flux - leaving) / (CAPACITY * width);
        flux = leaving;
      }
      return entering;
    }
  }

  /** Unknowns: gas temperature and cells; the density follows from the prescribed pressure. */
  private record RampedFill(Slab slab, int cells) implements FirstOrderDifferentialEquations {
    private static final double VOLUME = 0.05;
    private static final double AREA = 1.2;
    private static final double RISE = 195e5 / 180;

    @Override
    public int getDimension() {
      return 1 + cells;
    }

    @Override
    public void computeDerivatives(double t, double[] y, double[] rates) {
      State gas = NITROGEN.atTemperaturePressure(y[0], 5e5 + RISE * t);
      double supply = NITROGEN.atTemperaturePressure(293.15, 2.5e7).enthalpy();
      double heat = AREA * slab.rates(y[0], y, rates, cells);
      double densityByPressure = 1 / gas.dpdRho();
      double densityByTemperature = -gas.dpdT() / gas.dpdRho();
      double worth = gas.internalEnergy() - supply + gas.molarDensity() * gas.dudRho();
      double capacity = gas.molarDensity() * gas.cv() + worth * densityByTemperature;
      rates[0] = (-heat / VOLUME - worth * densityByPressure * RISE) / capacity;
    }
  }

  /** Unknowns: amount, internal energy and cells. */
  private record SteadyVent(Slab slab, int cells) implements FirstOrderDifferentialEquations {
    private static final double VOLUME = 2;
    private static final double AREA = 10;

    @Override
    public int getDimension() {
      return 2 + cells;
    }

    @Override
    public void computeDerivatives(double t, double[] y, double[] rates) {
      State gas = state(y);
      rates[0] = -0.28 / NITROGEN.molarMass();
      double heat = AREA * slab.rates(gas.temperature(), y, rates, cells);
      rates[1] = rates[0] * gas.enthalpy() - heat;
    }

    static State state(double[] y) {
      return NITROGEN.atDensityEnergy(y[0] / VOLUME, y[1] / y[0], 270);
    }
  }

  private static double[] solve(
      FirstOrderDifferentialEquations equations, double[] start, double end) {
    double[] y = start.clone();
    new DormandPrince853Integrator(1e-9, 10, 1e-7, 1e-8).integrate(equations, 0, y, end, y);
    return y;
  }

  /** The limit of no cell size, from one grid and one twice as fine. */
  private static double limit(double coarse, double fine) {
    return fine + (fine - coarse) / 3;
  }

  private static Path benchmark(String name) {
    WallBenchmarkTest.Case found =
        WallBenchmarkTest.cases().filter(c -> c.name().equals(name)).findFirst().orElseThrow();
    ModelledVessel model = Jobs.model(found.vessel(), found.ambient());
    return Jobs.path(model.run(found.steps().get(0), model.start()));
  }

  @Test
  void rampedFillOfASteelVesselIsTheSame() {
    Slab slab = new Slab(0.006, 150, 8, 293.15);
    double[] gas = new double[2];
    double[] surface = new double[2];
    for (int k = 0; k < 2; k++) {
      int cells = 6 * (k + 1);
      double[] start = new double[1 + cells];
      Arrays.fill(start, 293.15);
      double[] end = solve(new RampedFill(slab, cells), start, 180);
      gas[k] = end[0];
      surface[k] = slab.surface(end[0], end, cells);
    }
    PathPoint last = benchmark("N2-fill-steel").last();
    assertEquals(limit(gas[0], gas[1]), last.temperature(), 2e-3);
    assertEquals(limit(surface[0], surface[1]), last.innerWall().orElseThrow(), 2e-3);
  }

  @Test
  void ventOfAThickSteelVesselAtConstantFlowIsTheSame() {
    Slab slab = new Slab(0.022, 30, 6, 288.15);
    State full = NITROGEN.atTemperaturePressure(288.15, 4.1e6);
    double amount = full.molarDensity() * SteadyVent.VOLUME;
    double[] gas = new double[2];
    double[] surface = new double[2];
    double pressure = 0;
    for (int k = 0; k < 2; k++) {
      int cells = 8 * (k + 1);
      double[] start = new double[2 + cells];
      Arrays.fill(start, 288.15);
      start[0] = amount;
      start[1] = amount * full.internalEnergy();
      double[] end = solve(new SteadyVent(slab, cells), start, 300);
      State state = SteadyVent.state(end);
      gas[k] = state.temperature();
      surface[k] = slab.surface(state.temperature(), end, cells);
      pressure = state.pressure();
    }
    PathPoint last = benchmark("N2-vent-thick-steel").last();
    assertEquals(limit(gas[0], gas[1]), last.temperature(), 2e-3);
    assertEquals(limit(surface[0], surface[1]), last.innerWall().orElseThrow(), 2e-3);
    assertEquals(pressure, last.pressure(), 1e-5 * pressure);
  }
}
