package org.gasmargin.worksheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.util.List;
import org.gasmargin.rules.JudgeOn;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.verapdf.gf.foundry.VeraGreenfieldFoundryProvider;
import org.verapdf.pdfa.Foundries;
import org.verapdf.pdfa.PDFAParser;
import org.verapdf.pdfa.PDFAValidator;
import org.verapdf.pdfa.flavours.PDFAFlavour;
import org.verapdf.pdfa.results.TestAssertion;
import org.verapdf.pdfa.results.ValidationResult;

/** Source of the rules: the validation profiles of ISO 19005-3 and ISO 14289-1 in veraPDF. */
class ConformityTest {
  @BeforeAll
  static void start() {
    VeraGreenfieldFoundryProvider.initialise();
  }

  @ParameterizedTest
  @EnumSource(
      value = PDFAFlavour.class,
      names = {"PDFA_3_A", "PDFUA_1"})
  void sheetConforms(PDFAFlavour flavour) throws Exception {
    assertEquals(List.of(), failures(PdfText.pdf(SampleJob.content()), flavour));
  }

  @ParameterizedTest
  @EnumSource(
      value = PDFAFlavour.class,
      names = {"PDFA_3_A", "PDFUA_1"})
  void sheetWithWallCreditConforms(PDFAFlavour flavour) throws Exception {
    WorksheetContent content = SampleJob.withFindings(SampleJob.findings(), JudgeOn.MODELLED);
    assertEquals(List.of(), failures(PdfText.pdf(content), flavour));
  }

  private static List<String> failures(byte[] pdf, PDFAFlavour flavour) throws Exception {
    try (PDFAParser parser =
            Foundries.defaultInstance().createParser(new ByteArrayInputStream(pdf), flavour);
        PDFAValidator validator = Foundries.defaultInstance().createValidator(flavour, false)) {
      ValidationResult result = validator.validate(parser);
      assertTrue(result.getTotalAssertions() > 100, "the validator looked at the file");
      return result.getTestAssertions().stream()
          .filter(assertion -> assertion.getStatus() == TestAssertion.Status.FAILED)
          .map(
              a ->
                  a.getRuleId().getClause()
                      + "-"
                      + a.getRuleId().getTestNumber()
                      + " "
                      + a.getMessage()
                      + " "
                      + a.getLocation().getContext())
          .distinct()
          .toList();
    }
  }
}
