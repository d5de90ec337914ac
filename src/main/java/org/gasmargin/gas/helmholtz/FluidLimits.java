package org.gasmargin.gas.helmholtz;

import java.util.List;
import java.util.Locale;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.gas.ValidityRange;
import org.gasmargin.gas.equation.EquationPoint;
import org.gasmargin.gas.phase.MeltingLine;
import org.gasmargin.gas.phase.PhaseBoundary;
import org.gasmargin.gas.phase.PhaseEnds;

/**
 * What a state of one fluid must keep to be handed out: range of the equation, one stable phase,
 * not solid, finite.
 *
 * @param name name of the fluid in messages
 * @param range range of temperature and pressure
 * @param maxDensity highest density inside that range, mol/m3
 * @param phases gap between gas and liquid
 * @param melting melting lines, may be empty
 */
public record FluidLimits(
    String name,
    ValidityRange range,
    double maxDensity,
    PhaseBoundary phases,
    List<MeltingLine> melting) {

  /** Lets a state that an iteration placed on a limit pass in spite of rounding. */
  private static final double ROUNDING = 1e-9;

  private static final double PASCAL_PER_BAR = 1e5;

  /** Copies the list. */
  public FluidLimits {
    melting = List.copyOf(melting);
  }

  /** Low end of the range for a search, K: a hair wider, so that a state on the limit is found. */
  double coldest() {
    return range.minTemperature() * (1 - ROUNDING);
  }

  /** High end of the range for a search, K. */
  double hottest() {
    return range.maxTemperature() * (1 + ROUNDING);
  }

  boolean hasTemperature(double temperature) {
    return temperature >= coldest() && temperature <= hottest();
  }

  void requireTemperature(double temperature) {
    if (!hasTemperature(temperature)) {
      throw refusal(
          "%s at %.6g K is outside the range of its equation of state, %.6g K to %.6g K",
          name, temperature, range.minTemperature(), range.maxTemperature());
    }
  }

  void requirePressure(double pressure) {
    if (!(pressure > 0 && pressure <= range.maxPressure() * (1 + ROUNDING))) {
      throw refusal(
          "%s at %.6g bar(a) is outside the range of its equation of state, above 0 to %.6g bar(a)",
          name, pressure / PASCAL_PER_BAR, range.maxPressure() / PASCAL_PER_BAR);
    }
  }

  void requireDensity(double density) {
    if (!(density > 0 && density <= maxDensity)) {
      throw refusal(
          "%s at a density of %.6g mol/m3 is outside the range of its equation of state, above 0 to"
              + " %.6g mol/m3",
          name, density, maxDensity);
    }
  }

  void requireFinite(String quantity, double value) {
    if (!Double.isFinite(value)) {
      throw refusal("%s: %s must be a finite number, not %s", name, quantity, value);
    }
  }

  /** Whether the point is one stable phase, gas or liquid. */
  boolean isStable(EquationPoint point) {
    double temperature = point.temperature();
    return temperature >= phases.gapCloses()
        || phases.isStable(temperature, point.density(), point.pressure());
  }

  /** The state at a point, if it keeps every limit. */
  State accept(EquationPoint point) {
    double temperature = point.temperature();
    double density = point.density();
    requireTemperature(temperature);
    requireDensity(density);
    State state = point.toState();
    double pressure = state.pressure();
    if (!isStable(point)) {
      throw insideGap(temperature);
    }
    requirePressure(pressure);
    requireFluid(temperature, pressure);
    // The sum is finite only if each part is; cv and dp/drho are above zero in a stable phase.
    double sum =
        state.internalEnergy() + state.entropy() + state.cp() + state.speedOfSound() + state.dpdT();
    if (!(Double.isFinite(sum) && state.cv() > 0 && state.dpdRho() > 0)) {
      throw refusal(
          "%s at %.6g K and %.6g mol/m3 is no stable state of its equation of state",
          name, temperature, density);
    }
    return state;
  }

  private void requireFluid(double temperature, double pressure) {
    for (MeltingLine line : melting) {
      if (line.isSolid(temperature, pressure)) {
        throw refusal(
            "%s at %.6g K and %.6g bar(a) is solid: at this temperature it is fluid up to %.6g bar(a)",
            name,
            temperature,
            pressure / PASCAL_PER_BAR,
            line.pressure(temperature) / PASCAL_PER_BAR);
      }
    }
  }

  /** Refusal of a state between gas and liquid, or of a liquid that is not modelled. */
  OutsideValidity insideGap(double temperature) {
    PhaseEnds ends = phases.endsAt(temperature);
    double limit = ends.vapourPressure() / PASCAL_PER_BAR;
    if (ends.liquidDensity() == Double.POSITIVE_INFINITY) {
      return refusal(
          "%s at %.6g K would begin to condense: only gas is modelled, at this temperature up to"
              + " %.6g bar(a)",
          name, temperature, limit);
    }
    return refusal(
        "%s at %.6g K would begin to condense: at this temperature it is gas up to %.6g bar(a),"
            + " %.6g mol/m3, and liquid from %.6g mol/m3",
        name, temperature, limit, ends.vapourDensity(), ends.liquidDensity());
  }

  static OutsideValidity refusal(String format, Object... arguments) {
    return new OutsideValidity(String.format(Locale.ROOT, format, arguments));
  }
}
