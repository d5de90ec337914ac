package org.gasmargin.vessel;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;

/**
 * Depths of the cell faces of a layered wall, graded: fine where heat enters a layer, coarser
 * behind.
 *
 * <p>The first cell of a layer is half the distance that heat diffuses in the time that heat needs
 * to get there, at most a fortieth of the layer; in the innermost layer that time is {@value
 * #FIRST_TIME} s, which makes the first cell 0.01 mm in a plastic liner and 0.08 mm in steel. Each
 * further cell is {@value #GROWTH} times as wide as the one before, up to a fortieth of the layer.
 */
final class WallGrid {
  /** Time that the first cell resolves, s. */
  private static final double FIRST_TIME = 0.002;

  private static final double GROWTH = 1.08;
  private static final double WIDEST = 1.0 / 40;

  private final List<Double> faces = new ArrayList<>();
  private final List<Integer> layerOfCell = new ArrayList<>();

  /**
   * Divides the layers.
   *
   * @param layers from the inside to the outside
   * @param thicknesses m, one a layer
   * @param refinement every cell is divided into so many equal parts
   */
  WallGrid(List<Layer> layers, double[] thicknesses, int refinement) {
    faces.add(0.0);
    double time = FIRST_TIME;
    double depth = 0;
    for (int layer = 0; layer < thicknesses.length; layer++) {
      Material material = layers.get(layer).material();
      Material.Point point = material.points().get(0);
      double diffusivity = point.conductivity() / (material.density() * point.heatCapacity());
      double first = 0.5 * Math.sqrt(diffusivity * time);
      for (double width : widths(thicknesses[layer], first)) {
        for (int part = 1; part <= refinement; part++) {
          faces.add(depth + width * part / refinement);
          layerOfCell.add(layer);
        }
        depth += width;
      }
      time += 0.1 * thicknesses[layer] * thicknesses[layer] / diffusivity;
    }
  }

  /** Number of cells. */
  int cells() {
    return layerOfCell.size();
  }

  /** Depth of the inner face of a cell, m; the face after the last cell is the outer surface. */
  double face(int cell) {
    return faces.get(cell);
  }

  /** Depth of the middle of a cell, m. */
  double middle(int cell) {
    return 0.5 * (faces.get(cell) + faces.get(cell + 1));
  }

  /** Index of the layer that a cell belongs to. */
  int layer(int cell) {
    return layerOfCell.get(cell);
  }

  /** Thickness of all layers, m. */
  double depth() {
    return faces.get(faces.size() - 1);
  }

  /** Widths that grow geometrically from about {@code first} and fill the thickness exactly. */
  private static double[] widths(double thickness, double first) {
    double widest = thickness * WIDEST;
    List<Double> widths = new ArrayList<>();
    double width = Math.min(first, widest);
    double sum = 0;
    while (sum < thickness) {
      widths.add(width);
      sum += width;
      width = Math.min(width * GROWTH, widest);
    }
    double total = sum;
    return DoubleStream.of(widths.stream().mapToDouble(Double::doubleValue).toArray())
        .map(w -> w * thickness / total)
        .toArray();
  }
}
