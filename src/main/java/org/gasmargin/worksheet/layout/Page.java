package org.gasmargin.worksheet.layout;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSInteger;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;

/** One page, on which everything drawn either belongs to an element or is an artifact. */
public final class Page {
  private final PDPage page;
  private final PDPageContentStream stream;
  private final Canvas canvas;
  private final List<Element> owners = new ArrayList<>();

  Page(PDDocument document, Fonts fonts, PDRectangle size) {
    page = new PDPage(size);
    document.addPage(page);
    page.getCOSObject().setName("Tabs", "S");
    try {
      stream = new PDPageContentStream(document, page);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    canvas = new Canvas(stream, fonts, size.getHeight());
  }

  /** Draws content that belongs to an element. */
  public void tagged(Element element, Consumer<Canvas> painting) {
    int id = owners.size();
    owners.add(element);
    element.addContent(page, id);
    marked(element.dictionary().getCOSName(COSName.S), id, painting);
  }

  /** Draws a figure in a rectangle; its alternative text is what readers get. */
  void figure(
      Element figure, float x, float top, float width, float height, Consumer<Canvas> paint) {
    float pageHeight = page.getMediaBox().getHeight();
    figure.bounds(x, pageHeight - top - height, x + width, pageHeight - top);
    tagged(figure, paint);
  }

  /** Draws something that carries no meaning of its own: rules, fills, running titles. */
  public void artifact(Consumer<Canvas> painting) {
    marked(COSName.ARTIFACT, -1, painting);
  }

  /** Ends the page. */
  void close(int structureKey, COSArray parentTree) throws IOException {
    stream.close();
    page.setStructParents(structureKey);
    COSArray elements = new COSArray();
    owners.forEach(owner -> elements.add(owner.dictionary()));
    parentTree.add(COSInteger.get(structureKey));
    parentTree.add(elements);
  }

  /** Whether a character without a glyph was replaced on this page. */
  boolean showsReplacement() {
    return canvas.showsReplacement();
  }

  PDPage pdPage() {
    return page;
  }

  private void marked(COSName tag, int id, Consumer<Canvas> painting) {
    try {
      if (id < 0) {
        stream.beginMarkedContent(tag);
      } else {
        stream.beginMarkedContent(tag, id);
      }
      painting.accept(canvas);
      stream.endMarkedContent();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
