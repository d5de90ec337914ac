package org.gasmargin.process.modelled;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.gasmargin.vessel.Correlation;
import org.gasmargin.vessel.JetAndNaturalConvection;
import org.gasmargin.vessel.JetAndNaturalConvection.Numbers;

/**
 * Where a path leaves the range of the correlation for the film inside.
 *
 * @param notes in plain words
 * @param extrapolated whether it goes above the range, so that more heat is credited than was ever
 *     measured; below the range the correlation credits little
 */
record FilmNotes(List<String> notes, boolean extrapolated) {
  /** A given film coefficient has no range. */
  static final FilmNotes NONE = new FilmNotes(List.of(), false);

  /**
   * The notes of a path.
   *
   * @param film the correlation
   * @param samples instants of the path
   * @param filling whether gas flows in
   * @param molarMass kg/mol
   */
  static FilmNotes of(
      JetAndNaturalConvection film,
      List<PathRecorder.Sample> samples,
      boolean filling,
      double molarMass) {
    List<String> notes = new ArrayList<>();
    if (filling && !film.creditsJet()) {
      notes.add(
          "the bore of the inlet is not known: no stirring by the jet is credited, only natural"
              + " convection");
    }
    Range reynolds = new Range();
    Range rayleigh = new Range();
    for (PathRecorder.Sample sample : samples) {
      double surface = sample.innerSurface();
      double inflow = filling ? Math.max(0, sample.rate() * molarMass) : 0;
      Numbers numbers = film.numbers(sample.state(), surface, inflow);
      if (numbers.jetReynolds() > 0) {
        reynolds.take(numbers.jetReynolds());
      }
      if (Math.abs(sample.state().temperature() - surface) > 1) {
        rayleigh.take(numbers.rayleigh());
      }
    }
    reynolds.note("Re_d", Numbers.MIN_REYNOLDS, Numbers.MAX_REYNOLDS, notes);
    rayleigh.note("Ra_D", Numbers.MIN_RAYLEIGH, Numbers.MAX_RAYLEIGH, notes);
    boolean extrapolated =
        reynolds.highest > Numbers.MAX_REYNOLDS || rayleigh.highest > Numbers.MAX_RAYLEIGH;
    return new FilmNotes(notes, extrapolated);
  }

  /** Lowest and highest value of a dimensionless number. */
  private static final class Range {
    private double lowest = Double.POSITIVE_INFINITY;
    private double highest = Double.NEGATIVE_INFINITY;

    void take(double value) {
      lowest = Math.min(lowest, value);
      highest = Math.max(highest, value);
    }

    void note(String symbol, double from, double to, List<String> notes) {
      if (lowest < from || highest > to) {
        notes.add(
            String.format(
                Locale.ROOT,
                "%s runs from %.1e to %.1e, beyond the range %.0e to %.0e of the correlation for"
                    + " %s",
                symbol,
                lowest,
                highest,
                from,
                to,
                Correlation.JET_AND_NATURAL.name()));
      }
    }
  }
}
