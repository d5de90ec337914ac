package org.gasmargin.worksheet.handcheck;

import java.util.ArrayList;
import java.util.List;
import org.gasmargin.gas.Gas;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Step;
import org.gasmargin.process.Stretch;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.worksheet.numbers.Scale;

/** The pressure of a rigid vessel into which a known mass was charged without heat exchange. */
final class MassCharge {
  private static final int DIGITS = 5;

  private final Vessel vessel;
  private final Stretch stretch;
  private final Scale volumes;
  private final Scale flows;
  private final UnitFrame frame;
  private final DisplayUnits units;
  private final List<Line> lines = new ArrayList<>();

  MassCharge(Vessel vessel, Stretch stretch, DisplayUnits units) {
    this.vessel = vessel;
    this.stretch = stretch;
    this.units = units;
    this.frame = UnitFrame.of(stretch, units);
    boolean chosen = units.units().containsKey(Dimension.VOLUME);
    this.volumes = chosen ? Scale.of(Dimension.VOLUME, units) : new Scale(1e3, 0, "L");
    this.flows = Scale.of(Dimension.MASS_FLOW, units);
  }

  /** The highest pressure: most flow, least volume, hottest supply. */
  Calculation highestPressure(Step.Fill fill, Drive.MassFlow flow) {
    Gas gas = vessel.gas();
    double supplyTemperature = fill.supply().temperature().high();
    Rounded start = frame.kelvin(lines, "T₁", "start", stretch.startTemperature());
    Rounded supply = frame.kelvin(lines, "T₀", "supply", supplyTemperature);
    Rounded p1 = frame.pressure(lines, "p₁", "start", stretch.startPressure());
    HeatCapacityRatio ratio = HeatCapacityRatio.of(gas, stretch.startTemperature());
    lines.add(ratio.line());
    Rounded gamma = ratio.value();
    Rounded startMass = startMass(start, p1);
    Rounded added = addedMass(flow);
    Rounded r = Rounded.significant(1 + added.value() / startMass.value(), DIGITS);
    add("r", "m₂ / m₁ = 1 + Δm / m₁", "1 + " + added + " / " + startMass, r, "");
    double t2 =
        RigidVessel.chargedTemperatureByMass(
            gamma.value(), supply.value(), start.value(), r.value());
    Rounded end = Rounded.to(t2, 2);
    String charged = "(" + start + " + (" + r + " − 1) × " + gamma + " × " + supply + ") / " + r;
    add("T₂", "(T₁ + (r − 1) γ T₀) / r", charged, end, "K");
    Rounded p2 = frame.roundedPressure(p1.value() * r.value() * end.value() / start.value());
    String filledIn = p1 + " × " + r + " × " + end + " / " + start;
    add("p₂", "p₁ r T₂ / T₁", filledIn, p2, frame.absoluteSymbol());
    frame.backToGauge(lines, "p₂", p2);
    double ideal = frame.pascal(p2.value());
    return new Calculation(
        "Known mass charged without heat exchange: p₂ = p₁ r T₂/T₁",
        lines,
        ideal,
        new Bands.Key(Bands.MASS_CHARGE, gas.id(), ideal, r.value(), supplyTemperature, 1));
  }

  private Rounded startMass(Rounded start, Rounded p1) {
    double specific = Gas.MOLAR_GAS_CONSTANT / vessel.gas().molarMass();
    Rounded constant = Rounded.significant(specific, DIGITS);
    lines.add(Line.given("R/M", "gas constant over molar mass", constant, "J/(kg K)"));
    Rounded volume = Rounded.significant(volumes.shown(vessel.volume().low()), DIGITS);
    lines.add(Line.given("V", "least volume", volume, volumes.symbol()));
    String product = "1 " + frame.absoluteSymbol() + " " + volumes.symbol();
    double joules = frame.pascal(1) * volumes.toSi(1);
    Rounded factor = Rounded.significant(joules, DIGITS);
    lines.add(Line.given("f", product + " in joules", factor, "J"));
    double exact =
        factor.value() * p1.value() * volume.value() / (constant.value() * start.value());
    Rounded mass = Rounded.significant(exact, DIGITS);
    String filledIn =
        factor + " × " + p1 + " × " + volume + " / (" + constant + " × " + start + ")";
    add("m₁", "f p₁ V / ((R/M) T₁)", filledIn, mass, "kg");
    return mass;
  }

  private Rounded addedMass(Drive.MassFlow flow) {
    double perSecond = flows.toSi(1);
    Rounded rate = Rounded.significant(flow.massFlow().high(), DIGITS);
    if (units.units().containsKey(Dimension.MASS_FLOW) && perSecond != 1) {
      Rounded typed = Rounded.significant(flows.shown(flow.massFlow().high()), DIGITS);
      Rounded factor = Rounded.significant(perSecond, DIGITS);
      rate = Rounded.significant(typed.value() * factor.value(), DIGITS);
      String from = "greatest flow, " + flows.symbol() + " to kg/s";
      add("ṁ", from, typed + " × " + factor, rate, "kg/s");
    } else {
      lines.add(Line.given("ṁ", "greatest flow", rate, "kg/s"));
    }
    Rounded time = Rounded.significant(flow.duration(), DIGITS);
    Rounded added = Rounded.significant(rate.value() * time.value(), DIGITS);
    add("Δm", "ṁ t, t in s", rate + " × " + time, added, "kg");
    return added;
  }

  private void add(String symbol, String formula, String filledIn, Rounded result, String unit) {
    lines.add(new Line(symbol, formula, filledIn, result, unit));
  }
}
