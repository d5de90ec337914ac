package org.gasmargin.worksheet.layout;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.text.Normalizer;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeSet;
import org.apache.fontbox.ttf.CmapLookup;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.font.PDType0Font;
import org.jspecify.annotations.Nullable;

/**
 * The two faces of a sheet, loaded when first used and embedded as subsets. A character without a
 * glyph is shown as {@link #REPLACEMENT} and remembered, so that the sheet can say so.
 */
public final class Fonts {
  /** Stands for a character that the faces lack. */
  public static final String REPLACEMENT = "\u25a1";

  private final PDDocument document;
  private final TreeSet<Integer> missing = new TreeSet<>();
  private @Nullable Face regular;
  private @Nullable Face bold;

  Fonts(PDDocument document) {
    this.document = document;
  }

  /** The width of a text that {@link #drawable} made, pt. */
  public float width(String text, Style style) {
    return face(style).width(text) * style.size();
  }

  /**
   * The text with every character that cannot be drawn replaced: white space by a blank, control
   * characters by nothing, a missing glyph by {@link #REPLACEMENT}. Blanks that do not break stay.
   */
  public String drawable(String text) {
    int plain = 0;
    while (plain < text.length() && text.charAt(plain) >= ' ' && text.charAt(plain) < 0x7f) {
      plain++;
    }
    return plain == text.length() ? text : replaceUndrawable(text);
  }

  /** The same in one line: line feeds become blanks. */
  public String oneLine(String text) {
    return drawable(text).replace('\n', ' ');
  }

  /** The characters that were replaced so far, in the form {@code U+4E2D}. */
  public List<String> missing() {
    return missing.stream().map(c -> String.format(Locale.ROOT, "U+%04X", c)).toList();
  }

  PDType0Font font(Style style) {
    return face(style).font;
  }

  private String replaceUndrawable(String text) {
    String composed =
        text.chars().anyMatch(c -> c >= 0x300 && c < 0x370)
            ? Normalizer.normalize(text, Normalizer.Form.NFC)
            : text;
    StringBuilder result = new StringBuilder(composed.length());
    composed
        .codePoints()
        .forEach(
            c -> {
              if (Character.isWhitespace(c)) {
                result.append(c == '\n' ? '\n' : ' ');
              } else if (Character.isISOControl(c) || Character.getType(c) == Character.FORMAT) {
                return;
              } else if (face(Style.BODY).has(c) && face(Style.STRONG).has(c)) {
                result.appendCodePoint(c);
              } else {
                missing.add(c);
                result.append(REPLACEMENT);
              }
            });
    return result.toString();
  }

  private Face face(Style style) {
    if (style.bold()) {
      if (bold == null) {
        bold = new Face(document, "DejaVuSans-Bold.ttf");
      }
      return bold;
    }
    if (regular == null) {
      regular = new Face(document, "DejaVuSans.ttf");
    }
    return regular;
  }

  private static final class Face {
    private final PDType0Font font;
    private final CmapLookup glyphs;
    private final Map<Integer, Float> widths = new HashMap<>();

    Face(PDDocument document, String resource) {
      try (InputStream in = Fonts.class.getResourceAsStream("/fonts/" + resource)) {
        if (in == null) {
          throw new IllegalStateException("the program lacks its font " + resource);
        }
        TrueTypeFont file = new TTFParser().parse(new RandomAccessReadBuffer(in.readAllBytes()));
        file.setEnableGsub(false);
        font = PDType0Font.load(document, file, true);
        glyphs = font.getCmapLookup();
      } catch (IOException e) {
        throw new UncheckedIOException(e);
      }
    }

    boolean has(int codePoint) {
      return glyphs.getGlyphId(codePoint) != 0;
    }

    float width(String text) {
      float sum = 0;
      for (int i = 0; i < text.length(); i += Character.charCount(text.codePointAt(i))) {
        sum += widths.computeIfAbsent(text.codePointAt(i), this::widthOf);
      }
      return sum;
    }

    private float widthOf(int codePoint) {
      try {
        return font.getStringWidth(Character.toString(codePoint)) / 1000;
      } catch (IOException e) {
        throw new UncheckedIOException(e);
      }
    }
  }
}
