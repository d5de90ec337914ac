package org.gasmargin.yaml;

import java.util.Comparator;
import org.gasmargin.units.Place;

/** The order in which things stand in files. */
public final class PlaceOrder {
  /** By file, line and column. */
  public static final Comparator<Place> IN_FILE =
      Comparator.comparing(Place::file)
          .thenComparingInt(Place::line)
          .thenComparingInt(Place::column);

  private PlaceOrder() {}
}
