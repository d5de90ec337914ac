package org.gasmargin.worksheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSBase;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
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
    WorksheetContent content = SampleJob.credited();
    assertEquals(List.of(), failures(PdfText.pdf(content), flavour));
  }

  @ParameterizedTest
  @EnumSource(
      value = PDFAFlavour.class,
      names = {"PDFA_3_A", "PDFUA_1"})
  void sheetWithOddTextConforms(PDFAFlavour flavour) throws Exception {
    String title = "充气 <Receiver> & \"co\"\n\u0001 \ud83d\ude00 \u202e Ж";
    WorksheetContent content = SampleJob.titled(SampleJob.content(), title, "λ\u0000");
    assertEquals(List.of(), failures(PdfText.pdf(content), flavour));
  }

  /** The validator itself must be able to fail: a figure loses its alternative text. */
  @Test
  void validatorSeesAMissingAlternativeText() throws Exception {
    byte[] pdf = PdfText.pdf(SampleJob.content());
    ByteArrayOutputStream spoilt = new ByteArrayOutputStream();
    try (PDDocument document = Loader.loadPDF(pdf)) {
      removeAlternatives(
          document.getDocumentCatalog().getCOSObject().getCOSDictionary(COSName.STRUCT_TREE_ROOT));
      document.save(spoilt);
    }
    List<String> failures = failures(spoilt.toByteArray(), PDFAFlavour.PDFUA_1);
    assertTrue(failures.stream().anyMatch(f -> f.startsWith("7.3-1")), failures.toString());
  }

  private static void removeAlternatives(COSDictionary element) {
    element.removeItem(COSName.ALT);
    COSBase kids = element.getDictionaryObject(COSName.K);
    if (kids instanceof COSDictionary child) {
      removeAlternatives(child);
    } else if (kids instanceof COSArray array) {
      for (int i = 0; i < array.size(); i++) {
        if (array.getObject(i) instanceof COSDictionary child && !child.containsKey(COSName.MCID)) {
          removeAlternatives(child);
        }
      }
    }
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
