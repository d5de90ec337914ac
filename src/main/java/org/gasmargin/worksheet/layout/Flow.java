package org.gasmargin.worksheet.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Places blocks one below the other and begins a new page where the next piece does not fit. */
public final class Flow {
  private final Sheet sheet;
  private final List<Queued> held = new ArrayList<>();
  private Element parent;
  private Page page;
  private float y = Sheet.TOP;
  private float gap;

  /** A flow from the top of the first page of a sheet. */
  public Flow(Sheet sheet) {
    this.sheet = sheet;
    this.parent = sheet.document();
    this.page = sheet.newPage();
  }

  /**
   * A piece that waits for the ones that it must stay together with.
   *
   * @param gap space before it, pt
   * @param bookmark the words by which it can be found
   */
  private record Queued(Piece piece, float gap, Optional<String> bookmark) {}

  /** Begins a section with a heading that is also a bookmark. */
  public void section(String heading) {
    parent = sheet.document().child("Sect");
    gap(11);
    for (Piece piece : new SectionHeading(heading).lay(parent, sheet.fonts(), width())) {
      queue(piece, Optional.of(heading));
    }
    gap(4);
  }

  /** Leaves space before the next block, except at the top of a page. */
  public void gap(float height) {
    gap = Math.max(gap, height);
  }

  /** Places a block. */
  public void add(Block block) {
    for (Piece piece : block.lay(parent, sheet.fonts(), width())) {
      queue(piece, Optional.empty());
    }
  }

  /** Places what still waits for a successor. */
  public void end() {
    placeHeld();
  }

  private static float width() {
    return Sheet.CONTENT_WIDTH;
  }

  private void queue(Piece piece, Optional<String> bookmark) {
    held.add(new Queued(piece, gap, bookmark));
    gap = 0;
    if (!piece.keepsWithNext()) {
      placeHeld();
    }
  }

  private void placeHeld() {
    float needed = 0;
    for (Queued queued : held) {
      needed += queued.gap() + queued.piece().height();
    }
    boolean together = needed <= Sheet.BOTTOM - Sheet.TOP;
    if (together && y + needed > Sheet.BOTTOM) {
      newPage();
    }
    for (Queued queued : held) {
      place(queued);
    }
    held.clear();
  }

  private void place(Queued queued) {
    Piece piece = queued.piece();
    if (y > Sheet.TOP && y + queued.gap() + piece.height() > Sheet.BOTTOM) {
      newPage();
    }
    if (y > Sheet.TOP) {
      y += queued.gap();
    } else if (piece.repeated().isPresent()) {
      Piece repeated = piece.repeated().get();
      repeated.painter().paint(page, Sheet.LEFT, y);
      y += repeated.height();
    }
    queued.bookmark().ifPresent(words -> sheet.bookmark(words, page, y));
    piece.painter().paint(page, Sheet.LEFT, y);
    y += piece.height();
  }

  private void newPage() {
    page = sheet.newPage();
    y = Sheet.TOP;
  }
}
