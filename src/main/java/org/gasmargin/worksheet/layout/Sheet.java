package org.gasmargin.worksheet.layout;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentCatalog;
import org.apache.pdfbox.pdmodel.PageMode;
import org.apache.pdfbox.pdmodel.common.PDMetadata;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.common.PDStream;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.destination.PDPageXYZDestination;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDDocumentOutline;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDOutlineItem;
import org.apache.pdfbox.pdmodel.interactive.viewerpreferences.PDViewerPreferences;

/**
 * A tagged A4 document that conforms to PDF/A-3a and PDF/UA-1. It carries no clock, so the same
 * content gives the same bytes.
 */
public final class Sheet implements AutoCloseable {
  /** Left edge of the content, pt. */
  public static final float LEFT = 42.5f;

  /** Width of the content, pt. */
  public static final float CONTENT_WIDTH = PDRectangle.A4.getWidth() - 2 * LEFT;

  static final float TOP = 46;
  static final float BOTTOM = PDRectangle.A4.getHeight() - 48;
  private static final float FOOTER = PDRectangle.A4.getHeight() - 41;

  private final PDDocument document = new PDDocument();
  private final Fonts fonts = new Fonts(document);
  private final COSDictionary structure = new COSDictionary();
  private final Element root = Element.document(structure);
  private final List<Page> pages = new ArrayList<>();
  private final PDDocumentOutline outline = new PDDocumentOutline();

  /**
   * What stands on every page.
   *
   * @param title of the document
   * @param language of the text, for example {@code en-GB}
   * @param producer name and version of the program
   * @param header running title from the second page on, left and right
   * @param headerRight right part of the running title
   * @param footer left part of the footer; the right part counts pages
   * @param footerMiddle middle part of the footer
   * @param identity number from which the file identifier is made
   */
  public record Marks(
      String title,
      String language,
      String producer,
      String header,
      String headerRight,
      String footer,
      String footerMiddle,
      long identity) {}

  /** For measuring text. */
  public Fonts fonts() {
    return fonts;
  }

  /** The element that holds the document. */
  public Element document() {
    return root;
  }

  /** Draws the running titles and writes the file. */
  public void write(Marks marks, OutputStream out) throws IOException {
    for (int i = 0; i < pages.size(); i++) {
      running(marks, i);
    }
    COSArray parentTree = new COSArray();
    for (int i = 0; i < pages.size(); i++) {
      pages.get(i).close(i, parentTree);
    }
    structure.setItem(COSName.TYPE, COSName.getPDFName("StructTreeRoot"));
    structure.setItem(COSName.K, root.dictionary());
    COSDictionary numbers = new COSDictionary();
    numbers.setItem(COSName.NUMS, parentTree);
    structure.setItem(COSName.getPDFName("ParentTree"), numbers);
    structure.setInt("ParentTreeNextKey", pages.size());
    describe(marks);
    document.setDocumentId(marks.identity());
    document.save(out);
  }

  @Override
  public void close() throws IOException {
    document.close();
  }

  Page newPage() {
    Page page = new Page(document, fonts, PDRectangle.A4);
    pages.add(page);
    return page;
  }

  void bookmark(String words, Page page, float y) {
    PDPageXYZDestination destination = new PDPageXYZDestination();
    destination.setPage(page.pdPage());
    destination.setLeft(0);
    destination.setTop((int) (PDRectangle.A4.getHeight() - y + 6));
    PDOutlineItem item = new PDOutlineItem();
    item.setTitle(words);
    item.setDestination(destination);
    outline.addLast(item);
  }

  private void running(Marks marks, int index) {
    float right = LEFT + CONTENT_WIDTH;
    Page page = pages.get(index);
    page.artifact(
        canvas -> {
          if (index > 0) {
            float roomForTitle =
                CONTENT_WIDTH - canvas.width(marks.headerRight(), Style.SMALL) - 12;
            canvas.text(shortened(marks.header(), roomForTitle), LEFT, TOP - 16, Style.SMALL);
            canvas.text(marks.headerRight(), right, TOP - 16, Style.SMALL, Canvas.Anchor.RIGHT);
            canvas.line(LEFT, TOP - 11, right, TOP - 11, Stroke.HAIRLINE);
          }
          canvas.line(LEFT, FOOTER, right, FOOTER, Stroke.HAIRLINE);
          float baseline = FOOTER + 10;
          String count = String.format(Locale.ROOT, "page %d of %d", index + 1, pages.size());
          canvas.text(shortened(marks.footer(), 200), LEFT, baseline, Style.SMALL);
          canvas.text(
              marks.footerMiddle(),
              LEFT + CONTENT_WIDTH / 2,
              baseline,
              Style.SMALL,
              Canvas.Anchor.CENTRE);
          canvas.text(count, right, baseline, Style.SMALL, Canvas.Anchor.RIGHT);
          if (page.showsReplacement()) {
            canvas.text(missingGlyphs(), LEFT, baseline + 10, Style.SMALL);
          }
        });
  }

  private String missingGlyphs() {
    List<String> missing = fonts.missing();
    String named = String.join(" ", missing.subList(0, Math.min(8, missing.size())));
    return Fonts.REPLACEMENT
        + " stands for a character that the fonts of this sheet lack: "
        + named
        + (missing.size() > 8 ? " …" : "");
  }

  private String shortened(String text, float width) {
    String whole = fonts.oneLine(text);
    if (fonts.width(whole, Style.SMALL) <= width) {
      return whole;
    }
    int end = whole.length();
    while (end > 0 && fonts.width(whole.substring(0, end) + "…", Style.SMALL) > width) {
      end = whole.offsetByCodePoints(end, -1);
    }
    return whole.substring(0, end) + "…";
  }

  private void describe(Marks marks) throws IOException {
    document.setVersion(1.7f);
    document.getDocumentInformation().setTitle(Xmp.clean(marks.title()));
    document.getDocumentInformation().setProducer(Xmp.clean(marks.producer()));
    PDDocumentCatalog catalog = document.getDocumentCatalog();
    catalog.setLanguage(marks.language());
    catalog.getCOSObject().setItem(COSName.STRUCT_TREE_ROOT, structure);
    COSDictionary markInfo = new COSDictionary();
    markInfo.setBoolean("Marked", true);
    catalog.getCOSObject().setItem(COSName.MARK_INFO, markInfo);
    PDViewerPreferences preferences = new PDViewerPreferences(new COSDictionary());
    preferences.setDisplayDocTitle(true);
    catalog.setViewerPreferences(preferences);
    catalog.setDocumentOutline(outline);
    catalog.setPageMode(PageMode.USE_OUTLINES);
    PDMetadata metadata = new PDMetadata(document);
    metadata.importXMPMetadata(
        Xmp.packet(marks.title(), marks.producer(), marks.language())
            .getBytes(StandardCharsets.UTF_8));
    catalog.setMetadata(metadata);
    COSArray intents = new COSArray();
    intents.add(intent());
    catalog.getCOSObject().setItem(COSName.OUTPUT_INTENTS, intents);
  }

  private COSDictionary intent() throws IOException {
    PDStream profile = new PDStream(document);
    try (OutputStream out = profile.createOutputStream(COSName.FLATE_DECODE)) {
      out.write(GrayProfile.bytes());
    }
    profile.getCOSObject().setInt(COSName.N, 1);
    COSDictionary intent = new COSDictionary();
    intent.setItem(COSName.TYPE, COSName.OUTPUT_INTENT);
    intent.setName(COSName.S, "GTS_PDFA1");
    intent.setString(COSName.OUTPUT_CONDITION_IDENTIFIER, GrayProfile.NAME);
    intent.setString(COSName.INFO, GrayProfile.NAME);
    intent.setItem(COSName.DEST_OUTPUT_PROFILE, profile);
    return intent;
  }
}
