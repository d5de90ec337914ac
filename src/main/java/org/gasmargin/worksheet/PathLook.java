package org.gasmargin.worksheet;

import java.util.List;
import org.gasmargin.process.PathKind;
import org.gasmargin.worksheet.layout.Stroke;

/**
 * How a path is named in tables and drawn in plots.
 *
 * @param kind which path
 * @param letter at the end of its curves
 * @param words its name
 * @param stroke how its curves are drawn
 */
record PathLook(PathKind kind, String letter, String words, Stroke stroke) {
  /** All paths in the order of the tables. */
  static final List<PathLook> ALL =
      List.of(
          new PathLook(PathKind.ADIABATIC, "A", "adiabatic", Stroke.solid(1.1f, 0)),
          new PathLook(PathKind.MODELLED, "M", "modelled", Stroke.solid(2f, 0.5f)),
          new PathLook(PathKind.ISOTHERMAL, "I", "isothermal", Stroke.dashed(1f, 5f, 2.5f)),
          new PathLook(PathKind.UNMIXED, "U", "unmixed", Stroke.dashed(1.1f, 1.2f, 1.8f)));

  /** The look of a kind of path. */
  static PathLook of(PathKind kind) {
    return ALL.stream().filter(look -> look.kind() == kind).findFirst().orElseThrow();
  }
}
