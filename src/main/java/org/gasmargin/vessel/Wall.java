package org.gasmargin.vessel;

import java.util.List;

/**
 * A layered wall around the gas.
 *
 * @param shape geometry
 * @param layers from the inside to the outside, at least one
 * @param inside heat transfer from the gas
 * @param outside heat transfer to the surroundings
 */
public record Wall(WallShape shape, List<Layer> layers, InsideFilm inside, OutsideFilm outside) {

  /** Copies the list and refuses a wall without layers. */
  public Wall {
    layers = List.copyOf(layers);
    if (layers.isEmpty()) {
      throw new IllegalArgumentException("a wall needs at least one layer");
    }
  }
}
