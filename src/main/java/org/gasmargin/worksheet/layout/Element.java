package org.gasmargin.worksheet.layout;

import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSInteger;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDPage;

/** A node of the structure tree: what a part of the page means, for readers and for extraction. */
public final class Element {
  private final COSDictionary dictionary = new COSDictionary();
  private final COSArray kids = new COSArray();

  private Element(COSDictionary parent, String type) {
    dictionary.setItem(COSName.TYPE, COSName.getPDFName("StructElem"));
    dictionary.setItem(COSName.S, COSName.getPDFName(type));
    dictionary.setItem(COSName.P, parent);
    dictionary.setItem(COSName.K, kids);
  }

  /** The element that holds the whole document. */
  static Element document(COSDictionary treeRoot) {
    return new Element(treeRoot, "Document");
  }

  /**
   * Adds a child.
   *
   * @param type a standard structure type, for example {@code P}, {@code Table}, {@code Figure}
   */
  public Element child(String type) {
    Element child = new Element(dictionary, type);
    kids.add(child.dictionary);
    return child;
  }

  /** Gives the text that stands for a figure. */
  Element alternative(String text) {
    dictionary.setString(COSName.ALT, text);
    return this;
  }

  /** Gives the figure's place on its page. */
  void bounds(float left, float bottom, float right, float top) {
    COSDictionary layout = attributes("Layout");
    COSArray box = new COSArray();
    box.setFloatArray(new float[] {left, bottom, right, top});
    layout.setItem(COSName.BBOX, box);
    layout.setName("Placement", "Block");
  }

  /** Says which way a header cell points. */
  void scope(String scope) {
    attributes("Table").setName("Scope", scope);
  }

  /** Says that a cell covers several columns. */
  void columnSpan(int columns) {
    attributes("Table").setInt("ColSpan", columns);
  }

  COSDictionary dictionary() {
    return dictionary;
  }

  /** Hangs marked content of a page below this element. */
  void addContent(PDPage page, int markedContentId) {
    COSDictionary reference = new COSDictionary();
    reference.setItem(COSName.TYPE, COSName.getPDFName("MCR"));
    reference.setItem(COSName.PG, page);
    reference.setItem(COSName.MCID, COSInteger.get(markedContentId));
    kids.add(reference);
  }

  private COSDictionary attributes(String owner) {
    COSDictionary attributes = dictionary.getCOSDictionary(COSName.A);
    if (attributes == null) {
      attributes = new COSDictionary();
      attributes.setName(COSName.O, owner);
      dictionary.setItem(COSName.A, attributes);
    }
    return attributes;
  }
}
