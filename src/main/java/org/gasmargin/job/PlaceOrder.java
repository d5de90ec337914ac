package org.gasmargin.job;

import java.util.Comparator;
import org.gasmargin.units.Place;

/** The order in which things stand in one file. */
final class PlaceOrder {
  static final Comparator<Place> IN_FILE =
      Comparator.comparingInt(Place::line).thenComparingInt(Place::column);

  private PlaceOrder() {}
}
