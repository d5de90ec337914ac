package org.gasmargin.worksheet;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;

/** Writes worksheets and reads their text back. */
final class PdfText {
  private PdfText() {}

  static byte[] pdf(WorksheetContent content) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    Worksheet.write(content, out);
    return out.toByteArray();
  }

  /** The text in the order of the pages' content, with single blanks. */
  static String text(byte[] pdf) throws IOException {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      return new PDFTextStripper().getText(document).replaceAll("\\s+", " ");
    }
  }

  static String text(WorksheetContent content) throws IOException {
    return text(pdf(content));
  }
}
