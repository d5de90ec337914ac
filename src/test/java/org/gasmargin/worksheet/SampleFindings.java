package org.gasmargin.worksheet;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.Severity;
import org.gasmargin.rules.Verdict;
import org.gasmargin.units.Dimension;

/** Findings made for the page, with the numbers of a simulated procedure. */
final class SampleFindings {
  private static final String HOT =
      "A hot cylinder at the right pressure is not full. The nameplate decides.";
  private static final String COLD =
      "Let the metal warm before repressurising. The nameplate decides.";

  private SampleFindings() {}

  static List<Finding> all(ProcedureResult result) {
    Envelope fill = result.steps().get(0).envelope();
    Envelope hold = result.steps().get(1).envelope();
    Envelope vent = result.steps().get(2).envelope();
    return List.of(
        hot("1", fill),
        hot("2", hold),
        cold("3", vent),
        pressure("2", hold, Verdict.OVER_LIMIT),
        pressure("1", fill, Verdict.MARGIN_SHORT),
        missingLimit());
  }

  static Finding hot(String step, Envelope envelope) {
    Extreme extreme = envelope.highestGasTemperature().orElseThrow();
    return finding(
        "general.max_gas_temperature",
        "Gas temperature against the highest permitted gas temperature",
        step,
        Verdict.OVER_LIMIT,
        "highest mean gas temperature",
        Dimension.TEMPERATURE,
        extreme,
        338.15,
        338.15 - extreme.value(),
        5,
        HOT);
  }

  private static Finding cold(String step, Envelope envelope) {
    Extreme extreme = envelope.lowestGasTemperature().orElseThrow();
    return finding(
        "general.min_metal_temperature",
        "Metal temperature against the lowest permitted metal temperature",
        step,
        Verdict.OVER_LIMIT,
        "lowest metal temperature",
        Dimension.TEMPERATURE,
        extreme,
        253.15,
        extreme.value() - 253.15,
        5,
        COLD);
  }

  static Finding pressure(String step, Envelope envelope, Verdict verdict) {
    Extreme extreme = envelope.highestPressure().orElseThrow();
    double limit = 200e5 + SampleJob.ATMOSPHERE;
    return finding(
        "general.max_pressure",
        "Pressure against the highest permitted pressure",
        step,
        verdict,
        "highest pressure",
        Dimension.ABSOLUTE_PRESSURE,
        extreme,
        limit,
        limit - extreme.value(),
        4e5,
        "Never exceed a marked pressure because a calculation allows it.");
  }

  static Finding missingLimit() {
    return new Finding(
        "general.max_metal_temperature",
        "Metal temperature, hot end",
        "1",
        "receiver",
        Verdict.NOT_ASSESSED,
        Severity.DAMAGE,
        "highest metal temperature",
        Dimension.TEMPERATURE,
        OptionalDouble.of(391.2),
        OptionalDouble.empty(),
        Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        "fill without heat loss",
        "the job gives no max_metal_temperature; look it up on the nameplate",
        "A limit that nobody wrote down protects nobody.",
        "Pressure equipment practice",
        "common practice, no source");
  }

  static Finding finding(
      String rule,
      String title,
      String step,
      Verdict verdict,
      String quantity,
      Dimension dimension,
      Extreme predicted,
      double limit,
      double margin,
      double required,
      String caution) {
    return new Finding(
        rule,
        title,
        step,
        "receiver",
        verdict,
        Severity.DAMAGE,
        quantity,
        dimension,
        OptionalDouble.of(predicted.value()),
        OptionalDouble.of(limit),
        Optional.of("data sheet"),
        OptionalDouble.of(margin),
        OptionalDouble.of(required),
        predicted.path(),
        "the limit is passed",
        caution,
        "Practice of the gas trade",
        "common practice, no source");
  }
}
