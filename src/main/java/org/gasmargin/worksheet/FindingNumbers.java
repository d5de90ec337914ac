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
  private final double largest;
  private final int decimals;

  FindingNumbers(Finding finding, DisplayUnits units) {
    this.finding = finding;
    this.scale = Scale.of(finding.dimension(), units);
    this.differences = Scale.ofDifference(finding.dimension(), units);
    double predicted = Math.abs(scale.shown(finding.predicted().orElse(0)));
    this.largest = Math.max(predicted, Math.abs(scale.shown(finding.limit().orElse(0))));
    this.decimals = finding.dimension() == Dimension.TEMPERATURE ? 1 : decimals();
  }

  /** The unit of the predicted value and the limit. */
  String unit() {
    return finding.predicted().isPresent() || finding.limit().isPresent() ? scale.symbol() : "";
  }

  /** The unit of the margins. */
  String differenceUnit() {
    return finding.margin().isPresent() || finding.requiredMargin().isPresent()
        ? differences.symbol()
        : "";
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
    return Digits.decimalsFor(largest);
  }

  private String text(OptionalDouble value, Scale in) {
    if (value.isEmpty()) {
      return UNKNOWN;
    }
    double shown = in.shown(value.getAsDouble());
    boolean tiny = Math.abs(shown) < 0.5 * Math.pow(10, -decimals) && largest >= 1e-3;
    String number = tiny ? Digits.plain(shown, decimals) : Digits.of(shown, decimals);
    return number;
  }
}
