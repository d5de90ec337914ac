package org.gasmargin.worksheet;

import java.util.OptionalDouble;
import org.gasmargin.rules.Finding;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.worksheet.numbers.Digits;
import org.gasmargin.worksheet.numbers.Scale;

/** The numbers of a finding in the user's units, all with the same decimals. */
final class FindingNumbers {
  private static final String UNKNOWN = "–";

  private final Finding finding;
  private final Scale scale;
  private final Scale differences;
  private final int decimals;

  FindingNumbers(Finding finding, DisplayUnits units) {
    this.finding = finding;
    this.scale = Scale.of(finding.dimension(), units);
    this.differences = Scale.ofDifference(finding.dimension(), units);
    this.decimals = finding.dimension() == Dimension.TEMPERATURE ? 1 : decimals();
  }

  String predicted() {
    return text(finding.predicted(), scale);
  }

  String limit() {
    return text(finding.limit(), scale);
  }

  String margin() {
    return text(finding.margin(), differences);
  }

  String requiredMargin() {
    return text(finding.requiredMargin(), differences);
  }

  private int decimals() {
    double predicted = scale.shown(finding.predicted().orElse(0));
    double limit = scale.shown(finding.limit().orElse(0));
    return Digits.decimalsFor(predicted, limit);
  }

  private String text(OptionalDouble value, Scale in) {
    return value.isPresent() ? in.text(value.getAsDouble(), decimals) : UNKNOWN;
  }
}
