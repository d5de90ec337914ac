package org.gasmargin.worksheet.layout;

import java.io.IOException;
import java.io.UncheckedIOException;
import org.apache.pdfbox.pdmodel.PDPageContentStream;

/** Draws lines, areas and text on one page; knows nothing of tags. */
public final class Canvas {
  private static final char NO_BREAK = '\u00a0';

  private final PDPageContentStream stream;
  private final Fonts fonts;
  private final float pageHeight;
  private boolean showsReplacement;

  Canvas(PDPageContentStream stream, Fonts fonts, float pageHeight) {
    this.stream = stream;
    this.fonts = fonts;
    this.pageHeight = pageHeight;
  }

  /** Where a text stands against its point. */
  public enum Anchor {
    LEFT,
    CENTRE,
    RIGHT
  }

  /** The width that a text takes, pt. */
  public float width(String text, Style style) {
    return fonts.width(fonts.oneLine(text), style);
  }

  /** Draws text of one line with its baseline at {@code y}. */
  public void text(String text, float x, float y, Style style, Anchor anchor) {
    String drawable = fonts.oneLine(text);
    showsReplacement |= drawable.contains(Fonts.REPLACEMENT);
    float left =
        switch (anchor) {
          case LEFT -> x;
          case CENTRE -> x - fonts.width(drawable, style) / 2;
          case RIGHT -> x - fonts.width(drawable, style);
        };
    drawing(
        () -> {
          stream.setNonStrokingColor(style.gray());
          stream.beginText();
          stream.setFont(fonts.font(style), style.size());
          stream.newLineAtOffset(left, pageHeight - y);
          stream.showText(drawable.replace(NO_BREAK, ' '));
          stream.endText();
        });
  }

  /** Draws text of one line that starts at {@code x} with its baseline at {@code y}. */
  public void text(String text, float x, float y, Style style) {
    text(text, x, y, style, Anchor.LEFT);
  }

  /** Draws a straight line. */
  public void line(float x1, float y1, float x2, float y2, Stroke stroke) {
    polyline(new float[] {x1, x2}, new float[] {y1, y2}, stroke);
  }

  /** Draws a line through points. */
  public void polyline(float[] x, float[] y, Stroke stroke) {
    drawing(
        () -> {
          prepare(stroke);
          stream.moveTo(x[0], pageHeight - y[0]);
          for (int i = 1; i < x.length; i++) {
            stream.lineTo(x[i], pageHeight - y[i]);
          }
          stream.stroke();
        });
  }

  /** Fills a rectangle with a grey. */
  public void fill(float x, float top, float width, float height, float gray) {
    drawing(
        () -> {
          stream.setNonStrokingColor(gray);
          stream.addRect(x, pageHeight - top - height, width, height);
          stream.fill();
        });
  }

  /** Draws the outline of a rectangle. */
  public void outline(float x, float top, float width, float height, Stroke stroke) {
    drawing(
        () -> {
          prepare(stroke);
          stream.addRect(x, pageHeight - top - height, width, height);
          stream.stroke();
        });
  }

  /** Fills a triangle or another polygon with a grey. */
  public void polygon(float[] x, float[] y, float gray) {
    drawing(
        () -> {
          stream.setNonStrokingColor(gray);
          stream.moveTo(x[0], pageHeight - y[0]);
          for (int i = 1; i < x.length; i++) {
            stream.lineTo(x[i], pageHeight - y[i]);
          }
          stream.closePath();
          stream.fill();
        });
  }

  /** Fills a rectangle with slanting lines. */
  public void hatch(float x, float top, float width, float height, float spacing, Stroke stroke) {
    clipped(
        x,
        top,
        width,
        height,
        () -> {
          for (float start = -height; start < width; start += spacing) {
            line(x + start, top + height, x + start + height, top, stroke);
          }
        });
  }

  /** Draws with everything outside a rectangle cut off. */
  public void clipped(float x, float top, float width, float height, Runnable painting) {
    drawing(
        () -> {
          stream.saveGraphicsState();
          stream.addRect(x, pageHeight - top - height, width, height);
          stream.clip();
        });
    painting.run();
    drawing(stream::restoreGraphicsState);
  }

  /** Whether a character without a glyph was replaced in a text drawn so far. */
  boolean showsReplacement() {
    return showsReplacement;
  }

  private void prepare(Stroke stroke) throws IOException {
    stream.setStrokingColor(stroke.gray());
    stream.setLineWidth(stroke.width());
    float[] pattern = new float[stroke.dashes().size()];
    for (int i = 0; i < pattern.length; i++) {
      pattern[i] = stroke.dashes().get(i);
    }
    stream.setLineDashPattern(pattern, 0);
  }

  private static void drawing(Drawing drawing) {
    try {
      drawing.draw();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private interface Drawing {
    void draw() throws IOException;
  }
}
