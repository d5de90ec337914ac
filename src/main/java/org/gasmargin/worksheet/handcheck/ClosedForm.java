package org.gasmargin.worksheet.handcheck;

import java.util.ArrayList;
import java.util.List;
import org.gasmargin.gas.Gas;
import org.gasmargin.process.Stretch;
import org.gasmargin.units.DisplayUnits;

/** The closed forms, each filled in line by line with the numbers as printed. */
final class ClosedForm {
  private static final int TEMPERATURE_DECIMALS = 2;
  private static final int RATIO_DIGITS = 5;
  private static final String FROM_SHEET = "end pressure of the step";

  private final Gas gas;
  private final Stretch stretch;
  private final UnitFrame frame;
  private final List<Line> lines = new ArrayList<>();

  ClosedForm(Gas gas, Stretch stretch, DisplayUnits units) {
    this.gas = gas;
    this.stretch = stretch;
    this.frame = UnitFrame.of(stretch, units);
  }

  /** A rigid vessel charged without heat exchange from a main at a temperature, K, and pressure. */
  Calculation charge(double supplyTemperature, double supplyPressure) {
    Rounded start = startTemperature();
    Rounded supply = frame.kelvin(lines, "T₀", "supply", supplyTemperature);
    Rounded p1 = startPressure();
    Rounded p2 = endPressure();
    Rounded gamma = ratioOfHeatCapacities();
    Rounded a = Rounded.to(gamma.value() * supply.value() / start.value(), 4);
    add("a", "γ T₀ / T₁", gamma + " × " + supply + " / " + start, a, "");
    Rounded b = Rounded.significant(p1.value() / p2.value() * (a.value() - 1), RATIO_DIGITS);
    add("b", "(p₁ / p₂) (a − 1)", p1 + " / " + p2 + " × (" + a + " − 1)", b, "");
    double exact = gamma.value() * supply.value() / (1 + b.value());
    Rounded end = Rounded.to(exact, TEMPERATURE_DECIMALS);
    add("T₂", "γ T₀ / (1 + b)", gamma + " × " + supply + " / (1 + " + b + ")", end, "K");
    frame.back(lines, "t₂", end);
    double ratio = RigidVessel.massRatio(p2.value() / p1.value(), start.value(), end.value());
    add(
        "m₂ / m₁",
        "(p₂ / p₁) (T₁ / T₂)",
        p2 + " / " + p1 + " × " + start + " / " + end,
        Rounded.significant(ratio, 4),
        "");
    return new Calculation(
        "Fill without heat exchange: T₂ = γ T₀ / (1 + (p₁/p₂)(γ T₀/T₁ − 1))",
        lines,
        end.value(),
        new Bands.Key(
            Bands.CHARGE,
            gas.id(),
            supplyPressure,
            stretch.endPressure() / stretch.startPressure(),
            supplyTemperature,
            stretch.endPressure() / supplyPressure));
  }

  /** The isentrope of gas left behind in a vent. */
  Calculation vent() {
    double ratio = stretch.startPressure() / stretch.endPressure();
    return isentrope(
        "Gas left behind in a vent without heat exchange: T₂ = T₁ (p₂/p₁)^((γ−1)/γ)",
        true,
        new Bands.Key(
            Bands.VENT, gas.id(), stretch.startPressure(), ratio, stretch.startTemperature(), 1));
  }

  /** The isentrope of trapped gas, compressed without mixing. */
  Calculation compression() {
    double ratio = stretch.endPressure() / stretch.startPressure();
    return isentrope(
        "Trapped gas compressed without heat exchange: T₂ = T₁ (p₂/p₁)^((γ−1)/γ)",
        false,
        new Bands.Key(
            Bands.COMPRESSION,
            gas.id(),
            stretch.endPressure(),
            ratio,
            stretch.startTemperature(),
            1));
  }

  /** Constant volume and amount. */
  Calculation isochore() {
    Rounded start = startTemperature();
    Rounded end = frame.kelvin(lines, "T₂", "end", stretch.endTemperature());
    Rounded p1 = startPressure();
    Rounded p2 = frame.roundedPressure(p1.value() * end.value() / start.value());
    add("p₂", "p₁ T₂ / T₁", p1 + " × " + end + " / " + start, p2, frame.absoluteSymbol());
    frame.backToGauge(lines, "p₂", p2);
    return new Calculation(
        "Constant volume: p₂ = p₁ T₂ / T₁",
        lines,
        frame.pascal(p2.value()),
        new Bands.Key(
            Bands.ISOCHORE,
            gas.id(),
            stretch.startPressure(),
            stretch.endTemperature() / stretch.startTemperature(),
            stretch.startTemperature(),
            1));
  }

  private Calculation isentrope(String title, boolean massLeft, Bands.Key band) {
    Rounded start = startTemperature();
    Rounded p1 = startPressure();
    Rounded p2 = endPressure();
    Rounded gamma = ratioOfHeatCapacities();
    Rounded exponent = Rounded.to((gamma.value() - 1) / gamma.value(), RATIO_DIGITS);
    add("n", "(γ − 1) / γ", "(" + gamma + " − 1) / " + gamma, exponent, "");
    Rounded ratio = Rounded.significant(p2.value() / p1.value(), RATIO_DIGITS);
    add("r", "p₂ / p₁", p2 + " / " + p1, ratio, "");
    double exact = start.value() * Math.pow(ratio.value(), exponent.value());
    Rounded end = Rounded.to(exact, TEMPERATURE_DECIMALS);
    add("T₂", "T₁ rⁿ", start + " × " + ratio + " ^ " + exponent, end, "K");
    frame.back(lines, "t₂", end);
    if (massLeft) {
      Rounded left = Rounded.significant(RigidVessel.massLeft(gamma.value(), ratio.value()), 4);
      add("m₂ / m₁", "r^(1/γ)", ratio + " ^ (1 / " + gamma + ")", left, "");
    }
    return new Calculation(title, lines, end.value(), band);
  }

  private Rounded startTemperature() {
    return frame.kelvin(lines, "T₁", "start", stretch.startTemperature());
  }

  private Rounded startPressure() {
    return frame.pressure(lines, "p₁", "start", stretch.startPressure());
  }

  private Rounded endPressure() {
    return frame.pressure(lines, "p₂", FROM_SHEET, stretch.endPressure());
  }

  private Rounded ratioOfHeatCapacities() {
    HeatCapacityRatio ratio = HeatCapacityRatio.of(gas, stretch.startTemperature());
    lines.add(ratio.line());
    return ratio.value();
  }

  private void add(String symbol, String formula, String filledIn, Rounded result, String unit) {
    lines.add(new Line(symbol, formula, filledIn, result, unit));
  }
}
