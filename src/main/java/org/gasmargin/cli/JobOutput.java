package org.gasmargin.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.gasmargin.worksheet.SeriesCsv;
import org.gasmargin.worksheet.Worksheet;
import org.gasmargin.worksheet.WorksheetContent;

/**
 * The files that a check leaves: named after the job file, in one folder.
 *
 * @param job the job file
 * @param folder where to
 * @param withPdf whether the worksheet is wanted
 */
record JobOutput(Path job, Path folder, boolean withPdf) {

  /**
   * Writes the files together.
   *
   * @param content for the worksheet and the series
   * @param result the result as JSON
   * @return the files written
   * @throws InputRefused if the folder cannot be written
   */
  List<Path> write(WorksheetContent content, String result) {
    Map<String, byte[]> files = new LinkedHashMap<>();
    if (withPdf) {
      files.put(stem() + ".pdf", pdf(content));
    }
    files.put(stem() + ".json", utf8(result + "\n"));
    files.put(stem() + "-series.csv", utf8(SeriesCsv.text(content)));
    try {
      return new OutputFolder(folder).write(files);
    } catch (IOException e) {
      throw new InputRefused(
          List.of("gasmargin: cannot write to " + folder + ": " + e + "; choose another --out"));
    }
  }

  private String stem() {
    String name = String.valueOf(job.getFileName());
    int dot = name.lastIndexOf('.');
    return dot > 0 ? name.substring(0, dot) : name;
  }

  private static byte[] pdf(WorksheetContent content) {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try {
      Worksheet.write(content, bytes);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return bytes.toByteArray();
  }

  private static byte[] utf8(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }
}
