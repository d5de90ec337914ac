package org.gasmargin.job;

import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Place;
import org.gasmargin.units.Quantity;
import org.gasmargin.yaml.Issues;

/** Refuses values that no equipment can have and asks about those that hardly any has. */
final class Soundness {
  private final Issues issues;
  private final Confirmations confirmations;

  Soundness(Issues issues, Confirmations confirmations) {
    this.issues = issues;
    this.confirmations = confirmations;
  }

  /** Whether the value can be used; if not, or if it needs confirmation, an issue says so. */
  boolean holds(Quantity quantity, InputKind kind, String path, Place place) {
    if (kind == InputKind.ATMOSPHERIC_PRESSURE && quantity.unit().isGauge()) {
      issues.add(
          place,
          "the atmosphere itself cannot be a gauge pressure",
          "write for example \"1.013 bar(a)\"");
      return false;
    }
    if (!quantity.si().isExact() && !kind.isTolerant()) {
      issues.add(
          place,
          "a tolerance of " + path + " is not carried through the calculation",
          "write the one value that is worse for the vessel");
      return false;
    }
    if (quantity.si().nominal() < 0 || (quantity.si().nominal() == 0 && !kind.allowsZero())) {
      issues.add(place, quantity.typed() + belowZero(kind));
      return false;
    }
    if (quantity.si().low() < 0 || (quantity.si().low() == 0 && !kind.allowsZero())) {
      issues.add(place, quantity.typed() + " reaches zero within its tolerance");
      return false;
    }
    if (kind == InputKind.DISCHARGE_COEFFICIENT && quantity.si().high() > 1) {
      issues.add(
          place,
          quantity.typed() + " is above 1, more than an ideal nozzle passes",
          "a sharp orifice has about 0.6 to 0.85");
      return false;
    }
    askIfUnusual(quantity, kind, path, place);
    return true;
  }

  private String belowZero(InputKind kind) {
    return switch (kind.dimension()) {
      case ABSOLUTE_PRESSURE -> " is not above perfect vacuum, 0 bar(a)";
      case TEMPERATURE -> " is not above absolute zero, -273.15 degC";
      default ->
          kind.allowsZero()
              ? " is negative, " + kind.noun() + " cannot be"
              : " is not above zero, " + kind.noun() + " must be";
    };
  }

  private void askIfUnusual(Quantity quantity, InputKind kind, String path, Place place) {
    double value = quantity.si().nominal();
    if (value >= kind.usualLow() && value <= kind.usualHigh()) {
      return;
    }
    boolean high = value > kind.usualHigh();
    Dimension dimension = kind.dimension();
    String edge =
        DisplayUnits.of(quantity.unit().absolute(), 0)
            .format(high ? kind.usualHigh() : kind.usualLow(), dimension);
    confirmations.ask(
        path,
        place,
        "is "
            + quantity.typed()
            + " meant? "
            + (high ? "More" : "Less")
            + " than "
            + edge
            + " is unusual for "
            + kind.noun());
  }
}
