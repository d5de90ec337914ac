package org.gasmargin.worksheet.layout;

import java.util.ArrayList;
import java.util.List;

/**
 * Blocks with a bar along their left side and a grey ground, for what must not be overlooked.
 *
 * @param blocks what stands beside the bar
 * @param barWidth pt
 * @param barGray grey of the bar
 * @param ground grey of the ground
 */
public record Barred(List<Block> blocks, float barWidth, float barGray, float ground)
    implements Block {
  private static final float PADDING = 5;

  /** Copies the list. */
  public Barred {
    blocks = List.copyOf(blocks);
  }

  @Override
  public List<Piece> lay(Element parent, Fonts fonts, float width) {
    List<Piece> inner = new ArrayList<>();
    for (Block block : blocks) {
      inner.addAll(block.lay(parent, fonts, width - barWidth - 2 * PADDING));
    }
    List<Piece> pieces = new ArrayList<>();
    for (int i = 0; i < inner.size(); i++) {
      Piece piece = inner.get(i);
      boolean last = i == inner.size() - 1;
      float above = i == 0 ? PADDING : 0;
      float height = above + piece.height() + (last ? PADDING : 0);
      pieces.add(
          new Piece(
              height,
              !last,
              piece.repeated(),
              (page, x, top) -> {
                page.artifact(
                    canvas -> {
                      canvas.fill(x, top, width, height, ground);
                      canvas.fill(x, top, barWidth, height, barGray);
                    });
                piece.painter().paint(page, x + barWidth + PADDING, top + above);
              }));
    }
    return pieces;
  }
}
