package org.gasmargin.worksheet.layout;

/**
 * How a piece of text looks.
 *
 * @param bold bold or regular face
 * @param size size, pt
 * @param gray 0 black to 1 white
 */
public record Style(boolean bold, float size, float gray) {
  /** The smallest size on a sheet, pt: legible at arm's length on paper. */
  public static final float SMALLEST = 7.5f;

  /** Running text. */
  public static final Style BODY = new Style(false, 8.5f, 0);

  /** Emphasis in running text. */
  public static final Style STRONG = new Style(true, 8.5f, 0);

  /** Text of tables and figures. */
  public static final Style TABLE = new Style(false, 7.8f, 0);

  /** Headings in tables. */
  public static final Style TABLE_HEAD = new Style(true, SMALLEST, 0);

  /** Labels that stand behind the numbers. */
  public static final Style SMALL = new Style(false, SMALLEST, 0.25f);

  /** The title of the sheet. */
  public static final Style TITLE = new Style(true, 15f, 0);

  /** The heading of a section. */
  public static final Style SECTION = new Style(true, 10.5f, 0);

  /** The heading of a part of a section. */
  public static final Style SUBSECTION = new Style(true, 9f, 0);

  /** Refuses text that nobody can read. */
  public Style {
    if (!(size >= SMALLEST)) {
      throw new IllegalArgumentException("text below " + SMALLEST + " pt");
    }
  }

  /** The same in bold. */
  public Style strong() {
    return new Style(true, size, gray);
  }

  /** Distance from one baseline to the next, pt. */
  public float lineHeight() {
    return size * 1.28f;
  }

  /** Distance from the top of a line to its baseline, pt. */
  public float ascent() {
    return size * 0.98f;
  }
}
