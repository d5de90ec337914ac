package org.gasmargin.worksheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.apache.pdfbox.text.TextPosition;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.StepResult;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.rules.Verdict;
import org.gasmargin.units.Dimension;
import org.gasmargin.worksheet.layout.Fonts;
import org.junit.jupiter.api.Test;

/** Whatever stands in a job, the page holds it and says what it cannot show. */
class OddContentTest {
  @Test
  void characterWithoutGlyphIsReplacedAndNamed() throws IOException {
    String text = PdfText.text(SampleJob.titled(SampleJob.content(), "充气 Receiver Ж λ ż", "日"));
    assertTrue(text.contains(Fonts.REPLACEMENT + Fonts.REPLACEMENT + " Receiver Ж λ ż"), text);
    assertTrue(
        text.contains("stands for a character that the fonts of this sheet lack: U+5145 U+65E5"),
        text);
  }

  @Test
  void sheetWithoutStrangeCharactersHasNoSuchNote() throws IOException {
    assertFalse(PdfText.text(SampleJob.content()).contains(Fonts.REPLACEMENT));
  }

  @Test
  void controlCharactersAndLineFeedsDoNotStopTheSheet() throws IOException {
    String title = "One\ttwo\u0000three\u202efour\nfive \ud83d\ude00 six";
    String text = PdfText.text(SampleJob.titled(SampleJob.content(), title, ""));
    assertTrue(text.contains("One twothreefour"), text);
  }

  @Test
  void nothingLeavesThePage() throws IOException {
    String word = "Überlang".repeat(40);
    WorksheetContent content =
        SampleJob.with(SampleJob.steps(), manyFindings(100, word), JudgeOn.BOUNDS);
    assertNothingOutside(SampleJob.titled(content, word + " " + "word ".repeat(60), word));
    assertNothingOutside(SampleJob.content());
    assertTrue(PdfText.text(content).contains("that are listed further down: 60."));
    assertNothingOutside(unknown());
  }

  @Test
  void pathThatWasNotComputedSaysWhyAndShowsNoNumber() throws IOException {
    String text = PdfText.text(unknown());
    assertTrue(text.contains("A adiabatic NOT COMPUTED: The gas would condense at 90 K."), text);
    assertTrue(text.contains("M modelled none: no wall is given"), text);
    assertTrue(text.contains("highest gas temperature unknown"), text);
    assertTrue(text.contains("Extreme unknown: The gas would condense at 90 K."), text);
    assertTrue(text.contains("no balance: nothing could be computed"), text);
    assertTrue(text.contains("Findings No rule could be evaluated."), text);
    assertTrue(text.contains("No closed form leads to a number of this sheet"), text);
    assertFalse(text.contains("NaN"), text);
  }

  @Test
  void whatIsNoNumberIsADashAndNeverHolds() throws IOException {
    OptionalDouble nan = OptionalDouble.of(Double.NaN);
    List<PathPoint> points = new ArrayList<>();
    for (int i = 0; i < 4; i++) {
      points.add(new PathPoint(i, 1e5, 300, Double.NaN, 0, nan, nan));
    }
    StepResult sound = SampleJob.steps().get(1);
    Map<PathKind, PathOutcome> paths = new EnumMap<>(sound.paths());
    paths.put(
        PathKind.MODELLED,
        new PathOutcome.Computed(new Path(points, 300, 300, 1e5, 1e5, nan, nan)));
    StepResult odd =
        new StepResult(
            sound.step(),
            paths,
            sound.envelope(),
            Optional.empty(),
            Optional.of(new Closure(0, Double.NaN)),
            Optional.empty(),
            List.of(),
            List.of(),
            Optional.empty());
    String text =
        PdfText.text(
            SampleJob.with(List.of(odd), List.of(SampleFindings.missingLimit()), JudgeOn.BOUNDS));
    assertFalse(text.contains("NaN"), text);
    assertTrue(text.contains("Step 2 0 – 1.000×10⁻⁸ DOES NOT HOLD: not assessed"), text);
  }

  @Test
  void hugeAndTinyNumbersStayReadable() throws IOException {
    List<Finding> findings =
        List.of(
            number(Verdict.OVER_LIMIT, 4.2e21, 3e21, -1.2e21),
            number(Verdict.WITHIN_LIMITS, 3.1e-9, 5.5e-9, 2.4e-9),
            number(Verdict.WITHIN_LIMITS, 0, 0, 0));
    String text = PdfText.text(SampleJob.with(SampleJob.steps(), findings, JudgeOn.BOUNDS));
    assertTrue(text.contains("4.200×10²¹ 3.000×10²¹"), text);
    assertTrue(text.contains("3.100×10⁻⁹ 5.500×10⁻⁹"), text);
  }

  @Test
  void manyStepsKeepTheirOrder() throws IOException {
    List<StepResult> steps = new ArrayList<>();
    for (int i = 0; i < 17; i++) {
      steps.addAll(SampleJob.result().steps());
    }
    WorksheetContent content =
        SampleJob.with(steps, SampleFindings.all(SampleJob.result()), JudgeOn.BOUNDS);
    assertNothingOutside(content);
    String text = PdfText.text(content);
    assertEquals(18, text.split("Step 1: fill receiver", -1).length);
  }

  private static List<Finding> manyFindings(int count, String word) {
    List<Finding> findings = new ArrayList<>();
    Envelope envelope = SampleJob.result().steps().get(0).envelope();
    for (int i = 0; i < count; i++) {
      Finding hot = SampleFindings.hot("1", envelope);
      findings.add(
          SampleFindings.finding(
              "rule." + i,
              hot.title() + " " + word,
              "1",
              i % 3 == 0 ? Verdict.MARGIN_SHORT : Verdict.OVER_LIMIT,
              hot.quantity() + " " + i,
              Dimension.TEMPERATURE,
              new Extreme(hot.predicted().orElseThrow() + i, String.join(" ", word, "path")),
              338.15,
              338.15 - hot.predicted().orElseThrow() - i,
              5,
              "Caution " + i + ": " + "mind the gap ".repeat(20) + word));
    }
    return findings;
  }

  private static Finding number(Verdict verdict, double predicted, double limit, double margin) {
    return SampleFindings.finding(
        "odd.number" + predicted,
        "Odd number",
        "1",
        verdict,
        "odd number",
        Dimension.RATIO,
        new Extreme(predicted, ""),
        limit,
        margin,
        0,
        "");
  }

  /** A step of which nothing could be computed. */
  private static WorksheetContent unknown() {
    Map<PathKind, PathOutcome> paths = new EnumMap<>(PathKind.class);
    PathOutcome failed = new PathOutcome.Failed("the gas would condense at 90 K");
    paths.put(PathKind.ADIABATIC, failed);
    paths.put(PathKind.ISOTHERMAL, failed);
    paths.put(PathKind.UNMIXED, failed);
    paths.put(PathKind.MODELLED, new PathOutcome.Absent("no wall is given"));
    StepResult step =
        new StepResult(
            SampleJob.result().steps().get(0).step(),
            paths,
            new Envelope(
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                300,
                290,
                List.of("the gas would condense at 90 K")),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            List.of(),
            List.of("nothing could be computed"),
            Optional.empty());
    return SampleJob.with(List.of(step), List.of(SampleFindings.missingLimit()), JudgeOn.BOUNDS);
  }

  private static void assertNothingOutside(WorksheetContent content) throws IOException {
    List<String> outside = new ArrayList<>();
    try (PDDocument document = Loader.loadPDF(PdfText.pdf(content))) {
      PDFTextStripper stripper =
          new PDFTextStripper() {
            @Override
            protected void processTextPosition(TextPosition text) {
              float right = text.getX() + text.getWidth();
              boolean inside =
                  text.getX() >= 40 && right <= 556 && text.getY() >= 25 && text.getY() <= 825;
              if (!inside && !text.getUnicode().isBlank()) {
                outside.add(getCurrentPageNo() + ": " + text.getUnicode() + " " + text.getX());
              }
            }
          };
      stripper.getText(document);
    }
    assertEquals(List.of(), outside);
  }
}
