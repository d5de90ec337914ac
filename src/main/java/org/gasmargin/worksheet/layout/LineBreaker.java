package org.gasmargin.worksheet.layout;

import java.util.ArrayList;
import java.util.List;

/** Breaks styled text into lines at blanks, and within a word only if it is longer than a line. */
final class LineBreaker {
  private static final String BREAK_AFTER = "/_-.,;:";

  private final Fonts fonts;
  private final float width;
  private final List<Line> lines = new ArrayList<>();
  private List<Fragment> current = new ArrayList<>();
  private float used;

  private LineBreaker(Fonts fonts, float width) {
    this.fonts = fonts;
    this.width = width;
  }

  /**
   * Text at a distance from the start of its line.
   *
   * @param x pt
   */
  record Fragment(String text, Style style, float x) {}

  /**
   * A line of text.
   *
   * @param width what it takes, pt
   * @param height pt
   */
  record Line(List<Fragment> fragments, float width, float height) {
    /** Draws the line with its left end at {@code x}. */
    void draw(Canvas canvas, float x, float top) {
      float ascent = 0;
      for (Fragment fragment : fragments) {
        ascent = Math.max(ascent, fragment.style().ascent());
      }
      for (Fragment fragment : fragments) {
        canvas.text(fragment.text(), x + fragment.x(), top + ascent, fragment.style());
      }
    }
  }

  /** The lines of a text; at least one. */
  static List<Line> lines(List<Run> runs, Fonts fonts, float width) {
    LineBreaker breaker = new LineBreaker(fonts, width);
    Style last = Style.TABLE;
    for (Run run : runs) {
      last = run.style();
      breaker.add(fonts.drawable(run.text()), last);
    }
    breaker.endLine(last);
    return breaker.lines;
  }

  /** The width of the longest word, pt. */
  static float longestWord(List<Run> runs, Fonts fonts) {
    float longest = 0;
    for (Run run : runs) {
      for (String word : fonts.drawable(run.text()).split("[ \n]", -1)) {
        longest = Math.max(longest, fonts.width(word, run.style()));
      }
    }
    return longest;
  }

  private void add(String text, Style style) {
    int start = 0;
    while (start < text.length()) {
      char c = text.charAt(start);
      if (c == '\n') {
        endLine(style);
        start++;
      } else {
        int wordStart = start;
        while (wordStart < text.length() && text.charAt(wordStart) == ' ') {
          wordStart++;
        }
        int end = wordStart;
        while (end < text.length() && text.charAt(end) != ' ' && text.charAt(end) != '\n') {
          end++;
        }
        place(wordStart > start, text.substring(wordStart, end), style);
        start = end;
      }
    }
  }

  private void place(boolean blankBefore, String word, Style style) {
    float blank = blankBefore && !current.isEmpty() ? fonts.width(" ", style) : 0;
    float needed = fonts.width(word, style);
    if (!current.isEmpty() && used + blank + needed > width) {
      endLine(style);
      blank = 0;
    }
    String rest = word;
    while (fonts.width(rest, style) > width && rest.codePointCount(0, rest.length()) > 1) {
      int cut = cut(rest, style);
      append(0, rest.substring(0, cut), style);
      endLine(style);
      rest = rest.substring(cut);
    }
    append(blank, rest, style);
  }

  /** Where to cut a word that is longer than a line: after at least one character. */
  private int cut(String word, Style style) {
    int fitting = 0;
    int afterMark = 0;
    int i = 0;
    while (i < word.length()) {
      i += Character.charCount(word.codePointAt(i));
      if (fitting > 0 && fonts.width(word.substring(0, i), style) > width) {
        break;
      }
      fitting = i;
      if (BREAK_AFTER.indexOf(word.charAt(i - 1)) >= 0) {
        afterMark = i;
      }
    }
    return afterMark > fitting / 2 ? afterMark : fitting;
  }

  private void append(float blank, String word, Style style) {
    if (!current.isEmpty() && current.get(current.size() - 1).style().equals(style)) {
      Fragment last = current.remove(current.size() - 1);
      current.add(new Fragment(last.text() + (blank > 0 ? " " : "") + word, style, last.x()));
    } else {
      current.add(new Fragment((blank > 0 ? " " : "") + word, style, used));
    }
    used += blank + fonts.width(word, style);
  }

  private void endLine(Style style) {
    float height = current.isEmpty() ? style.lineHeight() : 0;
    for (Fragment fragment : current) {
      height = Math.max(height, fragment.style().lineHeight());
    }
    lines.add(new Line(List.copyOf(current), used, height));
    current = new ArrayList<>();
    used = 0;
  }
}
