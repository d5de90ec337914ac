package org.gasmargin.worksheet.layout;

import java.util.List;

/** Something that takes the width it is given and flows down the pages. */
public interface Block {
  /**
   * Breaks the block into pieces and hangs its elements below a parent. Called once.
   *
   * @param parent element that holds the block
   * @param fonts for measuring
   * @param width pt
   */
  List<Piece> lay(Element parent, Fonts fonts, float width);
}
