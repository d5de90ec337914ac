package org.gasmargin.worksheet;

import org.gasmargin.process.Drive;
import org.gasmargin.process.Step;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.Interval;
import org.gasmargin.worksheet.numbers.Digits;
import org.gasmargin.worksheet.numbers.Durations;
import org.gasmargin.worksheet.numbers.Scale;

/** Says in words what a step does. */
final class StepWords {
  private final WorksheetContent content;

  StepWords(WorksheetContent content) {
    this.content = content;
  }

  /** For example {@code Step 1: fill receiver from bank to 200.0 bar(g) within 180 s}. */
  String title(Step step) {
    return "Step " + step.id() + ": " + what(step);
  }

  private String what(Step step) {
    if (step instanceof Step.Fill fill) {
      return "fill " + fill.vessel() + " from " + fill.supply().name() + drive(fill.drive());
    }
    if (step instanceof Step.Vent vent) {
      return "vent " + vent.vessel() + drive(vent.drive());
    }
    if (step instanceof Step.Hold hold) {
      return "hold " + hold.vessel() + " for " + Durations.text(hold.duration());
    }
    Step.Compress compress = (Step.Compress) step;
    return "compress the gas in "
        + compress.vessel()
        + " to "
        + number(compress.until(), Dimension.ABSOLUTE_PRESSURE)
        + (compress.within() > 0 ? " within " + Durations.text(compress.within()) : ", suddenly");
  }

  private String drive(Drive drive) {
    if (drive instanceof Drive.PressureRamp ramp) {
      return " to "
          + number(ramp.until(), Dimension.ABSOLUTE_PRESSURE)
          + " within "
          + Durations.text(ramp.within());
    }
    if (drive instanceof Drive.MassFlow flow) {
      return " at "
          + number(flow.massFlow(), Dimension.MASS_FLOW)
          + " for "
          + Durations.text(flow.duration());
    }
    Drive.Orifice orifice = (Drive.Orifice) drive;
    StringBuilder words = new StringBuilder(" through an orifice of ");
    words.append(bore(orifice.diameter()));
    words.append(", Cd ").append(Digits.trimmed(orifice.dischargeCoefficient().nominal()));
    orifice
        .until()
        .ifPresent(p -> words.append(", to ").append(number(p, Dimension.ABSOLUTE_PRESSURE)));
    orifice.duration().ifPresent(t -> words.append(", at most ").append(Durations.text(t)));
    return words.toString();
  }

  /** Bores read best in millimetres where the user counts in metres. */
  private String bore(Interval diameter) {
    Scale scale = Scale.of(Dimension.LENGTH, content.units());
    return (scale.slope() == 1 ? Scale.MILLIMETRES : scale).text(diameter.nominal());
  }

  private String number(Interval value, Dimension dimension) {
    return Scale.of(dimension, content.units()).text(value.nominal());
  }
}
