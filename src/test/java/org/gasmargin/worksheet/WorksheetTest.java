package org.gasmargin.worksheet;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.Locale;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.gasmargin.rules.JudgeOn;
import org.junit.jupiter.api.Test;

class WorksheetTest {
  @Test
  void sameContentGivesTheSameBytes() throws IOException {
    assertArrayEquals(PdfText.pdf(SampleJob.content()), PdfText.pdf(SampleJob.content()));
  }

  @Test
  void verdictReasonAndCautionComeBeforeAnyResult() throws IOException {
    String text = PdfText.text(SampleJob.content());
    int verdict = text.indexOf("OVER LIMIT");
    int reason = text.indexOf("Step 3, receiver: Metal temperature, cold end reaches");
    int judgedOn = text.indexOf("Judged on the bounding paths");
    int caution = text.indexOf("Local codes, the nameplate and documents of the equipment");
    int findings = text.indexOf("Governing findings");
    int inputs = text.indexOf("Inputs as typed");
    int results = text.indexOf("Results by step");
    int signatures = text.indexOf("Signatures");
    assertTrue(verdict >= 0 && verdict < reason, text);
    assertTrue(reason < judgedOn && judgedOn < caution && caution < findings, text);
    assertTrue(findings < inputs && inputs < results && results < signatures, text);
    assertTrue(text.indexOf("Local codes", signatures) > 0, "cautions again at the signatures");
  }

  @Test
  void numbersOfARowStayInReadingOrder() throws IOException {
    String text = PdfText.text(SampleJob.content());
    assertTrue(text.contains("A adiabatic 137.3 24.0 137.3 200.0 200.0 8.53"), text);
  }

  @Test
  void inputsStandAsTypedWithSourceAndPlace() throws IOException {
    String text = PdfText.text(SampleJob.content());
    assertTrue(
        text.contains("vessels.receiver.limits.max_gas_temperature 65 degC fill procedure 7.2"));
    assertTrue(text.contains("site.ambient_temperature 24 degC ± 4 K not stated 3:14"), text);
  }

  @Test
  void creditForWallHeatStandsAtTheVerdictWithItsAllowance() throws IOException {
    WorksheetContent content = SampleJob.withFindings(SampleJob.findings(), JudgeOn.MODELLED);
    String text = PdfText.text(content);
    int credit = text.indexOf("CREDIT FOR WALL HEAT");
    int allowance = text.indexOf("Step 1: Inside film coefficient ± 30 %");
    assertTrue(credit > 0 && credit < allowance, text);
    assertTrue(allowance < text.indexOf("Governing findings"), text);
  }

  @Test
  void everyPageNamesJobHashVersionAndItsNumber() throws IOException {
    WorksheetContent content = SampleJob.content();
    try (PDDocument document = Loader.loadPDF(PdfText.pdf(content))) {
      int pages = document.getNumberOfPages();
      for (int page = 1; page <= pages; page++) {
        PDFTextStripper stripper = new PDFTextStripper();
        stripper.setStartPage(page);
        stripper.setEndPage(page);
        String text = stripper.getText(document);
        assertTrue(text.contains("page " + page + " of " + pages), text);
        assertTrue(text.contains("Job J-0142 · revision A"), text);
        assertTrue(text.contains("inputs 3f2a9c0d1e4b5a67 · gasmargin 0.1.0"), text);
      }
    }
    assertTrue(PdfText.text(content).contains(content.inputsSha256()), "the whole hash once");
  }

  @Test
  void sheetNeverSaysThatAnythingIsSafeOrApproved() throws IOException {
    String text = PdfText.text(SampleJob.content()).toLowerCase(Locale.ROOT);
    assertFalse(text.matches(".*\\b(safe|safely|approved|approves)\\b.*"), text);
    assertTrue(text.contains("approval"), "the box for a person is there");
  }
}
