package org.gasmargin.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import org.gasmargin.gas.Gas;
import org.gasmargin.process.StepResult;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

class SettledValuesTest {
  private static final List<RulePack> PACKS = RulePackLoader.load(Path.of("rules"));

  @ParameterizedTest
  @CsvFileSource(
      resources = "/published/settled-and-developed-pressures.csv",
      useHeadersInDisplayName = true)
  void settledAndDevelopedPressuresAgreeWithTheReference(
      String gasId, double startBar, double startCelsius, double endCelsius, double endBar) {
    Gas gas = SampleCase.gas(gasId);
    double density =
        gas.atTemperaturePressure(startCelsius + 273.15, startBar * 1e5).molarDensity();
    String rule =
        endCelsius == 65 ? "cylinder_fill.developed_pressure" : "cylinder_fill.settled_pressure";
    SampleCase subject =
        SampleCase.fill().with(gas).with(new StepResult.DensityRange(density, density));
    assertEquals(endBar * 1e5, predicted(subject, rule), 0.001 * endBar * 1e5);
  }

  @Test
  void theMostGasSetsTheSettledPressureAndTheLeastGasTheContent() {
    SampleCase subject = SampleCase.fill().with(new StepResult.DensityRange(3000, 7000));
    Gas gas = subject.gas();
    assertEquals(
        gas.at(288.15, 7000).pressure(), predicted(subject, "cylinder_fill.settled_pressure"));
    assertEquals(
        gas.at(288.15, 3000).pressure(), predicted(subject, "cylinder_fill.settled_content"));
    assertEquals(
        gas.at(338.15, 7000).pressure(), predicted(subject, "cylinder_fill.developed_pressure"));
  }

  @Test
  void anAmountBeyondTheRangeOfTheEquationIsNotAssessed() {
    SampleCase subject = SampleCase.fill().with(new StepResult.DensityRange(3000, 90_000));
    Finding finding = finding(subject, "cylinder_fill.developed_pressure");
    assertEquals(Verdict.NOT_ASSESSED, finding.verdict());
  }

  private static double predicted(SampleCase subject, String rule) {
    return finding(subject, rule).predicted().orElseThrow();
  }

  private static Finding finding(SampleCase subject, String rule) {
    return subject.judge(PACKS).findings().stream()
        .filter(finding -> finding.rule().equals(rule))
        .findFirst()
        .orElseThrow();
  }
}
