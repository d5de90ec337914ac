package org.gasmargin.worksheet.handcheck;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.gasmargin.worksheet.numbers.Digits;

/**
 * Ideal gas against real gas for one number.
 *
 * @param calculation the closed form
 * @param real the real-gas value, K or Pa absolute
 * @param highest whether a highest value is looked for, not a lowest
 * @param frame units
 * @param band where the real value must lie, if that is known
 */
record Comparison(
    Calculation calculation,
    double real,
    boolean highest,
    UnitFrame frame,
    Optional<Bands.Band> band) {
  private static final Set<String> PRESSURES = Set.of(Bands.ISOCHORE, Bands.MASS_CHARGE);

  /** Whether the real value lies in the band; empty if there is no band. */
  Optional<Boolean> agreement() {
    return band.map(known -> real >= low(known) && real <= high(known));
  }

  List<String> sentences() {
    List<String> sentences = new ArrayList<>();
    sentences.add(values());
    sentences.add(lean());
    sentences.add(bandSentence());
    return sentences;
  }

  private String values() {
    double difference = calculation.ideal() - real;
    return "Ideal gas "
        + text(calculation.ideal())
        + ", real gas "
        + text(real)
        + ": the ideal formula gives "
        + differenceText(Math.abs(difference))
        + (difference >= 0 ? " more." : " less.");
  }

  private String lean() {
    double difference = calculation.ideal() - real;
    if (Math.abs(difference) < 2e-4 * real) {
      return "The two agree so closely that the formula leans to neither side here.";
    }
    boolean unsafe = highest ? difference < 0 : difference > 0;
    String extreme = highest ? "highest" : "lowest";
    String quantity = isPressure() ? "pressure" : "temperature";
    String side = difference < 0 ? "LOW" : "HIGH";
    return "For a "
        + extreme
        + " "
        + quantity
        + " the ideal formula leans "
        + side
        + " here, which is the "
        + (unsafe
            ? "UNSAFE side: never use it alone. "
            : "conservative side; that does not hold for other gases and processes. ")
        + why();
  }

  private String why() {
    boolean idealHigh = calculation.ideal() > real;
    return switch (calculation.band().process()) {
      case Bands.CHARGE ->
          idealHigh
              ? "The real gas cools as it is throttled into the vessel and its heat capacity grows"
                  + " with pressure and temperature; the formula knows neither."
              : "The real gas warms as it is throttled into the vessel (it is above its inversion"
                  + " temperature); the formula does not know that.";
      case Bands.COMPRESSION ->
          idealHigh
              ? "The heat capacity of the real gas grows as it gets hot; the formula keeps it"
                  + " constant."
              : "At these densities the molecules of the real gas take more work to compress than"
                  + " the formula counts.";
      case Bands.VENT ->
          idealHigh
              ? "The real gas also works against the attraction of its molecules, or its heat"
                  + " capacity falls as it cools; the formula knows neither."
              : "The real gas has a larger heat capacity at these densities than the formula's"
                  + " constant one.";
      case Bands.MASS_CHARGE ->
          idealHigh
              ? "The attraction of the molecules holds the pressure of the real gas down, or the gas"
                  + " cools as it is throttled; the formula knows neither."
              : "The molecules of the real gas take up room at these densities, or the gas warms as"
                  + " it is throttled; the formula knows neither.";
      default ->
          idealHigh == calculation.band().ratio() > 1
              ? "The molecules of the real gas take up room, which counts less at the higher"
                  + " temperature; the formula has none."
              : "The attraction of the molecules, which holds the pressure down, counts less at the"
                  + " higher temperature; the formula has none.";
    };
  }

  private String bandSentence() {
    if (band.isEmpty()) {
      return "No band is known for this gas and range, so the two values cannot be held against"
          + " each other here.";
    }
    Bands.Band known = band.get();
    String words =
        "Band: in "
            + known.cases()
            + " cases of "
            + calculation.band().gas()
            + " over this range ("
            + known.range()
            + "), computed with published equations of state, real over ideal lay between "
            + Digits.plain(known.lower(), 3)
            + " and "
            + Digits.plain(known.upper(), 3)
            + ", so here between "
            + text(low(known))
            + " and "
            + text(high(known))
            + ". ";
    return words
        + (agreement().orElse(false)
            ? "The real-gas value lies inside."
            : "THE REAL-GAS VALUE LIES OUTSIDE: do not sign before somebody has explained why.");
  }

  private double low(Bands.Band known) {
    return known.lower() * calculation.ideal();
  }

  private double high(Bands.Band known) {
    return known.upper() * calculation.ideal();
  }

  private boolean isPressure() {
    return PRESSURES.contains(calculation.band().process());
  }

  private String text(double value) {
    if (isPressure()) {
      return frame.absoluteText(value);
    }
    return Digits.plain(value, 1) + "\u00a0K (" + frame.temperatureText(value) + ")";
  }

  private String differenceText(double value) {
    return isPressure() ? frame.differenceText(value) : Digits.plain(value, 1) + "\u00a0K";
  }
}
