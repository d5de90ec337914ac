package org.gasmargin.gas.phase;

/**
 * The gas side of a gap alone: liquid is refused like a mixture of gas and liquid, for whoever
 * works with gas throughout.
 *
 * @param whole the gap with both sides
 * @param criticalDensity density between those of gas and liquid at every temperature, mol/m3
 */
public record GasSide(PhaseBoundary whole, double criticalDensity) implements PhaseBoundary {
  @Override
  public double gapCloses() {
    return whole.gapCloses();
  }

  @Override
  public PhaseEnds endsAt(double temperature) {
    PhaseEnds ends = whole.endsAt(temperature);
    return new PhaseEnds(
        temperature,
        ends.vapourDensity(),
        ends.vapourPressure(),
        Double.POSITIVE_INFINITY,
        Double.POSITIVE_INFINITY);
  }

  @Override
  public boolean isStable(double temperature, double density, double pressure) {
    return density < criticalDensity && whole.isStable(temperature, density, pressure);
  }
}
