package org.gasmargin.worksheet;

import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.util.List;
import org.gasmargin.rules.Finding;
import org.gasmargin.worksheet.layout.Flow;
import org.gasmargin.worksheet.layout.Paragraph;
import org.gasmargin.worksheet.layout.Sheet;
import org.gasmargin.worksheet.layout.Style;

/** The document that a reviewer checks by hand and signs. */
public final class Worksheet {
  private static final int HASH_DIGITS_PER_PAGE = 16;
  private static final int MOST_ON_FIRST_PAGE = 6;

  private Worksheet() {}

  /**
   * Writes the worksheet as PDF/A-3a and PDF/UA-1. The same content gives the same bytes.
   *
   * @param content what to print
   * @param out left open
   * @throws IOException if {@code out} does not take the bytes
   */
  public static void write(WorksheetContent content, OutputStream out) throws IOException {
    try (Sheet sheet = new Sheet()) {
      Flow flow = new Flow(sheet);
      Governing governing = new Governing(content);
      FindingsTable findings = new FindingsTable(content, governing);
      new HeadingPart(content, governing).write(flow);
      governingFindings(flow, governing, findings);
      InputsPart.write(flow, content);
      new StepsPart(content).write(flow);
      allFindings(flow, governing, findings);
      new HandCheckPart(content, governing).write(flow);
      NotAssessedPart.write(flow, content);
      ClosurePart.write(flow, content);
      new MethodPart(content).write(flow);
      AssumptionsPart.write(flow, content);
      SignaturePart.write(flow, content, governing.findings());
      flow.end();
      sheet.write(marks(content), out);
    } catch (UncheckedIOException e) {
      throw e.getCause();
    }
  }

  private static void governingFindings(Flow flow, Governing governing, FindingsTable table) {
    List<Finding> deciding = governing.findings();
    flow.section("Governing findings");
    List<FindingGroup> groups = FindingGroup.of(deciding);
    flow.add(table.brief(groups.subList(0, Math.min(MOST_ON_FIRST_PAGE, groups.size()))));
    if (groups.size() > MOST_ON_FIRST_PAGE) {
      int more = groups.size() - MOST_ON_FIRST_PAGE;
      flow.gap(2);
      flow.add(
          Paragraph.of(
              "Rules with this verdict that are listed further down: " + more + ".",
              Style.TABLE.strong()));
    }
  }

  private static void allFindings(Flow flow, Governing governing, FindingsTable table) {
    List<Finding> assessed = governing.assessed();
    flow.section("Findings");
    if (assessed.isEmpty()) {
      flow.add(Paragraph.of("No rule could be evaluated.", Style.STRONG));
    } else {
      flow.add(table.full(FindingGroup.of(assessed)));
    }
  }

  private static Sheet.Marks marks(WorksheetContent content) {
    String hash = content.inputsSha256().substring(0, HASH_DIGITS_PER_PAGE);
    String job = "Job " + content.number() + " · revision " + content.revision();
    return new Sheet.Marks(
        content.title() + ", job " + content.number() + ", worksheet",
        "en-GB",
        "gasmargin " + content.programVersion(),
        content.title(),
        job + " · " + content.judgement().verdict().words(),
        job,
        "inputs " + hash + " · gasmargin " + content.programVersion(),
        Long.parseUnsignedLong(hash, 16));
  }
}
