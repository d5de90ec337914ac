package org.gasmargin.worksheet.handcheck;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.units.Interval;

/**
 * The state at the end of a fill from which a content settles to a temperature: the most gas is in
 * when it stayed as cold as its surroundings, the least when it gave off no heat.
 *
 * @param pressure at the end of the fill, Pa absolute
 * @param temperature at the end of the fill, K
 * @param settled temperature that the content takes on, K
 * @param most whether it is the most gas, not the least
 */
record FilledContent(double pressure, double temperature, double settled, boolean most) {
  private static final Pattern WORDS =
      Pattern.compile("pressure at (-?\\d+(?:\\.\\d+)?) degC of the (most|least) gas.*");
  private static final double ICE_POINT = 273.15;
  private static final double SAME = 1e-6;

  /** The content that a quantity speaks of; empty if it is another, or not at the end of a fill. */
  static Optional<FilledContent> of(String quantity, StepResult result, Gas gas) {
    Matcher words = WORDS.matcher(quantity);
    if (!words.matches()
        || !(result.step() instanceof Step.Fill fill)
        || !(fill.drive() instanceof Drive.PressureRamp ramp)
        || result.settledAmount().isEmpty()) {
      return Optional.empty();
    }
    double settled = Double.parseDouble(words.group(1)) + ICE_POINT;
    boolean most = words.group(2).equals("most");
    Interval until = ramp.until();
    StepResult.DensityRange amount = result.settledAmount().get();
    Optional<FilledContent> content =
        most
            ? Optional.of(
                new FilledContent(
                    until.high(), result.envelope().lowestSurroundings(), settled, true))
            : result
                .envelope()
                .highestGasTemperature()
                .map(Extreme::value)
                .map(hottest -> new FilledContent(until.low(), hottest, settled, false));
    double density = most ? amount.most() : amount.least();
    return content.filter(candidate -> candidate.holds(gas, density));
  }

  /** Whether the state really holds that much gas, mol/m3. */
  private boolean holds(Gas gas, double density) {
    try {
      double held = gas.atTemperaturePressure(temperature, pressure).molarDensity();
      return Math.abs(held / density - 1) < SAME;
    } catch (OutsideValidity beyond) {
      return false;
    }
  }
}
