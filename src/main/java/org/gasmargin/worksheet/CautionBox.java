package org.gasmargin.worksheet;

import java.util.List;
import org.gasmargin.rules.Finding;
import org.gasmargin.worksheet.layout.Barred;
import org.gasmargin.worksheet.layout.Gap;
import org.gasmargin.worksheet.layout.Paragraph;
import org.gasmargin.worksheet.layout.Run;
import org.gasmargin.worksheet.layout.Style;

/** The cautions, in the one form in which they stand at the verdict and at the signatures. */
final class CautionBox {
  private CautionBox() {}

  /** The cautions that always hold and those of some findings. */
  static Barred of(List<Finding> findings) {
    return new Barred(
        List.of(
            Paragraph.of(
                new Run("CAUTION  ", Style.STRONG), new Run(Cautions.DEFERENCE, Style.STRONG)),
            new Gap(2),
            Paragraph.of(Cautions.of(findings), Style.BODY)),
        4,
        0,
        0.94f);
  }
}
