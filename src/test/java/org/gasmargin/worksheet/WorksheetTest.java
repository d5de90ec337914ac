package org.gasmargin.worksheet;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.Locale;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.junit.jupiter.api.Test;

class WorksheetTest {
  @Test
  void sameContentGivesTheSameBytes() throws IOException {
    assertArrayEquals(PdfText.pdf(SampleJob.content()), PdfText.pdf(SampleJob.content()));
  }

  @Test
  void verdictReasonAndCautionComeBeforeAnyResult() throws IOException {
    String text = PdfText.text(SampleJob.content());
    assertInOrder(
        text,
        "OVER LIMIT",
        "Step 3, receiver: lowest metal temperature −",
        "limit −20.0 °C (data sheet): the limit is passed.",
        "Judged on the bounding paths",
        "Local codes, the nameplate and documents of the equipment",
        "Governing findings",
        "Inputs as typed",
        "Results by step",
        "Findings",
        "Hand check with the ideal gas",
        "Not assessed",
        "Closure of mass and energy",
        "Method, validity and sources",
        "Assumptions to be confirmed by the reviewer",
        "Signatures",
        "Local codes, the nameplate and documents of the equipment",
        "Preparation",
        "Independent check",
        "Approval");
  }

  @Test
  void numbersOfARowStayInReadingOrder() throws IOException {
    Path path = SampleJob.result().steps().get(0).path(PathKind.ADIABATIC).orElseThrow();
    String peak = String.format(Locale.ROOT, "%.1f", path.peakGasTemperature() - 273.15);
    String mass = String.format(Locale.ROOT, "%.2f", path.last().mass());
    assertInOrder(
        PdfText.text(SampleJob.content()),
        "Step 1: fill receiver from bank to 200 bar(g) within 180 s",
        "A adiabatic " + peak + " 24.0 " + peak + " 200.0 200.0 " + mass);
  }

  @Test
  void inputsStandAsTypedWithSourceAndPlace() throws IOException {
    assertInOrder(
        PdfText.text(SampleJob.content()),
        "From receiver-top-up.yaml",
        "site.ambient_temperature 24 degC ± 4 K not stated 3:14",
        "vessels.receiver.limits.max_gas_temperature 65 degC fill procedure 7.2 10:14");
  }

  @Test
  void extremesNameTheirPaths() throws IOException {
    String path =
        SampleJob.result().steps().get(2).envelope().lowestGasTemperature().orElseThrow().path();
    assertTrue(path.contains("then vent without heat gain"), path);
    assertInOrder(
        PdfText.text(SampleJob.content()),
        "Step 3: vent receiver through an orifice of 3 mm, Cd 0.8, to 10 bar(g)",
        "lowest gas temperature −",
        path.replace("degC", "°C"));
  }

  @Test
  void stepsWithTheSameNumbersShareALine() throws IOException {
    String text = PdfText.text(SampleJob.content());
    assertTrue(text.contains("1, 2 highest mean gas temperature"), text);
  }

  @Test
  void missingLimitIsSetApartAndKeptOutOfTheFindings() throws IOException {
    String text = PdfText.text(SampleJob.content());
    int findings = text.indexOf("Findings Step reference");
    int apart = text.indexOf("Not assessed These items are open");
    int title = text.indexOf("Metal temperature, hot end");
    assertTrue(findings > 0 && findings < apart && apart < title, text);
    assertTrue(text.contains("The job gives no max_metal_temperature; look it up"), text);
  }

  @Test
  void creditForWallHeatStandsAtTheVerdictWithItsAllowance() throws IOException {
    assertInOrder(
        PdfText.text(SampleJob.credited()),
        "CREDIT FOR WALL HEAT",
        "Step 1: Inside film coefficient ± 30 %",
        "Governing findings",
        "Extreme over all starts Bound Credited",
        "highest gas temperature",
        "66.9 °C",
        "highest wall temperature – 32.9 °C");
  }

  @Test
  void pathBeyondTheFitOfTheEquationIsWarnedOf() throws IOException {
    WorksheetContent content = SampleJob.filledWith("oxygen");
    assertEquals(
        300, content.result().procedure().vessels().get(0).gas().validity().fittedMaxTemperature());
    String text = PdfText.text(content);
    assertTrue(text.contains("BEYOND THE FIT: step 1, 2, 3 reaches up to "), text);
    assertTrue(text.contains("above 26.9 °C the equation of state of Oxygen extrapolates"), text);
    assertFalse(PdfText.text(SampleJob.content()).contains("BEYOND THE FIT"));
  }

  @Test
  void everyPageNamesJobHashVersionAndItsNumber() throws IOException {
    WorksheetContent content = SampleJob.content();
    try (PDDocument document = Loader.loadPDF(PdfText.pdf(content))) {
      int pages = document.getNumberOfPages();
      assertTrue(pages >= 2 && pages <= 5, pages + " pages");
      for (int page = 1; page <= pages; page++) {
        PDFTextStripper stripper = new PDFTextStripper();
        stripper.setStartPage(page);
        stripper.setEndPage(page);
        String text = stripper.getText(document);
        assertTrue(text.contains("page " + page + " of " + pages), text);
        assertTrue(text.contains("Job J-0142 · revision A"), text);
        assertTrue(text.contains("inputs 3f2a9c0d1e4b5a67 · gasmargin 0.1.0"), text);
      }
      assertEquals(
          content.title() + ", job J-0142, worksheet",
          document.getDocumentInformation().getTitle());
    }
    assertTrue(PdfText.text(content).contains(SampleJob.HASH), "the whole hash once");
  }

  @Test
  void sheetNeverSaysThatAnythingIsSafeOrApproved() throws IOException {
    for (WorksheetContent content :
        new WorksheetContent[] {SampleJob.content(), SampleJob.credited()}) {
      String text = PdfText.text(content).toLowerCase(Locale.ROOT);
      assertFalse(text.matches(".*\\b(safe|safely|approved|approves)\\b.*"), text);
      assertTrue(text.contains("approval"), "the box for a person is there");
    }
  }

  private static void assertInOrder(String text, String... parts) {
    int from = 0;
    for (String part : parts) {
      int at = text.indexOf(part, from);
      assertTrue(at >= 0, part + " is missing or out of order in: " + text);
      from = at + part.length();
    }
  }
}
