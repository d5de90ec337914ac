package org.gasmargin.gas.helmholtz;

import java.util.function.DoublePredicate;
import org.gasmargin.gas.State;
import org.gasmargin.gas.equation.BracketedNewton;
import org.gasmargin.gas.equation.EquationPoint;
import org.gasmargin.gas.equation.HelmholtzEquation;
import org.gasmargin.gas.phase.PhaseBoundary;
import org.gasmargin.gas.phase.PhaseEnds;

/**
 * States from pairs of properties other than temperature and density.
 *
 * <p>At fixed density u, p and s, and at fixed pressure s and h, rise with temperature over the
 * stable states, so there is at most one answer; the pressure of cold water, which does not, is
 * refused. A few Newton steps are tried first: whatever they reach counts only if it is accepted as
 * a stable state in range. Otherwise the stable range of temperature is bracketed, which either
 * finds the answer or shows that there is none.
 */
final class StateSearch {
  private static final int QUICK_STEPS = 15;
  private static final double LAST_STEP = 1e-9;

  /** What a bracketed search may leave of its target, as a relative change of temperature. */
  private static final double LEFT_OVER = 1e-8;

  /** A usual temperature to start from, K. */
  private static final double ROOM_TEMPERATURE = 300;

  private static final int HALVINGS = 60;

  private final HelmholtzEquation equation;
  private final FluidLimits limits;
  private final DensitySearch densities;

  StateSearch(HelmholtzEquation equation, FluidLimits limits, DensitySearch densities) {
    this.equation = equation;
    this.limits = limits;
    this.densities = densities;
  }

  /** A single-phase temperature to start from, K. */
  double usualTemperature() {
    double above = Math.max(ROOM_TEMPERATURE, 1.05 * limits.phases().gapCloses());
    return Math.min(above, limits.range().maxTemperature());
  }

  State atDensity(double density, FixedDensity.Property property, double target, double guess) {
    EquationPoint point = equation.newPoint();
    if (property == FixedDensity.Property.PRESSURE) {
      requireOneTemperature(point, density, target);
    }
    FixedDensity function = new FixedDensity(point, density, property, target);
    double start = limits.hasTemperature(guess) ? guess : usualTemperature();
    double quick = quickTemperature(function, start);
    if (limits.hasTemperature(quick)) {
      point.moveTo(quick, density);
      if (limits.isStable(point)) {
        return limits.accept(point);
      }
    }
    double coldest = coldestStable(density);
    bracketed(function, coldest, limits.hottest(), start);
    return limits.accept(point);
  }

  /** Cold water expands as it cools: there a density can meet one pressure at two temperatures. */
  private void requireOneTemperature(EquationPoint point, double density, double pressure) {
    point.moveTo(limits.coldest(), density);
    if (point.dpdT() <= 0 && point.pressure() >= pressure && limits.isStable(point)) {
      throw FluidLimits.refusal(
          "%s at a density of %.6g mol/m3: its pressure first falls and then rises as it warms, so"
              + " that density and pressure do not settle the temperature",
          limits.name(), density);
    }
  }

  private double quickTemperature(FixedDensity function, double start) {
    double temperature = start;
    for (int i = 0; i < QUICK_STEPS; i++) {
      function.moveTo(temperature);
      double slope = function.slope();
      double step = -function.excess() / slope;
      if (!(slope > 0) || !Double.isFinite(step)) {
        return Double.NaN;
      }
      double size = Math.abs(step);
      temperature += size > 0.5 * temperature ? 0.5 * temperature * Math.signum(step) : step;
      if (size < LAST_STEP * temperature) {
        return temperature;
      }
    }
    return Double.NaN;
  }

  /** Lowest temperature at which a density is one stable phase. */
  private double coldestStable(double density) {
    EquationPoint point = equation.newPoint();
    return lowest(temperature -> limits.isStable(point.moveTo(temperature, density)));
  }

  /** Lowest temperature below the closing of the gap from which on it holds, else the closing. */
  private double lowest(DoublePredicate holds) {
    double low = limits.coldest();
    double high = limits.phases().gapCloses();
    if (holds.test(low)) {
      return low;
    }
    for (int i = 0; i < HALVINGS; i++) {
      double middle = 0.5 * (low + high);
      if (holds.test(middle)) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return high;
  }

  /** Moves to the root between two temperatures, or refuses and says on which side it would lie. */
  private void bracketed(
      BracketedNewton.Rising function, double coldest, double hottest, double guess) {
    function.moveTo(coldest);
    if (function.excess() > 0) {
      if (coldest > limits.coldest()) {
        throw limits.insideGap(Math.min(coldest, Math.nextDown(limits.phases().gapCloses())));
      }
      throw FluidLimits.refusal(
          "%s would be colder than %.6g K, where the range of its equation of state begins",
          limits.name(), limits.range().minTemperature());
    }
    function.moveTo(hottest);
    if (function.excess() < 0) {
      throw FluidLimits.refusal(
          "%s would be hotter than %.6g K, where the range of its equation of state ends",
          limits.name(), limits.range().maxTemperature());
    }
    double temperature = BracketedNewton.solve(function, coldest, hottest, guess);
    function.moveTo(temperature);
    if (!(Math.abs(function.excess()) <= LEFT_OVER * temperature * function.slope())) {
      throw FluidLimits.refusal(
          "%s: the search for a state ended at %.6g K without meeting its target",
          limits.name(), temperature);
    }
  }

  State atPressure(double pressure, FixedPressure.Property property, double target) {
    EquationPoint point = equation.newPoint();
    FixedPressure function = new FixedPressure(point, densities, pressure, property, target);
    if (quickPoint(function, point)) {
      return limits.accept(point);
    }
    slowSearch(function, pressure);
    return limits.accept(point);
  }

  private boolean quickPoint(FixedPressure function, EquationPoint point) {
    function.moveTo(usualTemperature());
    for (int i = 0; i < QUICK_STEPS; i++) {
      double size = function.stepBoth();
      boolean possible =
          point.temperature() >= 0.5 * limits.range().minTemperature()
              && point.temperature() <= 2 * limits.range().maxTemperature()
              && point.density() <= 2 * limits.maxDensity();
      if (!possible || !Double.isFinite(size)) {
        return false;
      }
      if (size < LAST_STEP) {
        return limits.hasTemperature(point.temperature())
            && point.density() <= limits.maxDensity()
            && limits.isStable(point);
      }
    }
    return false;
  }

  private static boolean isLiquid(PhaseEnds ends, double pressure) {
    return pressure > ends.vapourPressure() && pressure >= ends.liquidPressure();
  }

  /**
   * Searches the liquid and the gas part of the isobar. Above the critical pressure the two parts
   * meet where the gap closes.
   */
  private void slowSearch(FixedPressure function, double pressure) {
    PhaseBoundary phases = limits.phases();
    double minimum = limits.coldest();
    double liquidEnds = lowest(t -> !isLiquid(phases.endsAt(t), pressure));
    if (liquidEnds > minimum) {
      double lastLiquid = Math.nextDown(liquidEnds);
      function.moveTo(lastLiquid);
      if (function.excess() >= 0) {
        bracketed(function, minimum, lastLiquid, lastLiquid);
        return;
      }
    }
    double gasBegins = lowest(t -> pressure <= phases.endsAt(t).vapourPressure());
    bracketed(function, gasBegins, limits.hottest(), usualTemperature());
  }
}
