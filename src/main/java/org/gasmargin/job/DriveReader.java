package org.gasmargin.job;

import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.process.Drive;
import org.gasmargin.units.Quantity;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;

/** Reads what sets the flow of a fill or a vent. */
final class DriveReader {
  private final Quantities quantities;
  private final Issues issues;

  DriveReader(Quantities quantities) {
    this.quantities = quantities;
    issues = quantities.issues();
  }

  /**
   * A drive with the target as it was typed.
   *
   * @param drive for the step
   * @param until the target pressure, if there is one
   */
  record Driven(Drive drive, Optional<Quantity> until) {}

  /** A ramp ({@code until}, {@code within}) or a mass flow ({@code mass_flow}, {@code for}). */
  Optional<Driven> rampOrMassFlow(Fields fields) {
    if (fields.has("mass_flow")) {
      fields.refuse("until", "mass_flow");
      fields.refuse("within", "mass_flow");
      Optional<Quantity> flow = quantities.needed(fields, "mass_flow", InputKind.MASS_FLOW);
      Optional<Double> duration = quantities.number(fields, "for", InputKind.DURATION);
      return flow.flatMap(
          rate ->
              duration.map(
                  time -> new Driven(new Drive.MassFlow(rate.si(), time), Optional.empty())));
    }
    if (!fields.has("until") && !fields.has("within")) {
      issues.add(
          fields.owner().key(),
          fields.owner().path() + " does not say how far and how fast",
          "give until and within, or mass_flow and for");
      return Optional.empty();
    }
    fields.refuse("for", "until");
    Optional<Quantity> until = quantities.needed(fields, "until", InputKind.PRESSURE);
    Optional<Double> within = quantities.number(fields, "within", InputKind.DURATION);
    return until.flatMap(
        target -> within.map(time -> new Driven(new Drive.PressureRamp(target.si(), time), until)));
  }

  /** An orifice to the atmosphere, with {@code until}, {@code for} or both. */
  Optional<Driven> orifice(Fields fields) {
    fields.refuse("within", "through");
    fields.refuse("mass_flow", "through");
    Optional<Fields> through =
        fields
            .find("through")
            .flatMap(value -> Fields.of(value, issues, "orifice", "discharge_coefficient"));
    Optional<Quantity> diameter =
        through.flatMap(hole -> quantities.needed(hole, "orifice", InputKind.ORIFICE));
    Optional<Quantity> coefficient =
        through.flatMap(
            hole ->
                quantities.needed(hole, "discharge_coefficient", InputKind.DISCHARGE_COEFFICIENT));
    if (!fields.has("until") && !fields.has("for")) {
      issues.add(
          fields.owner().key(),
          fields.owner().path() + " does not say when to stop",
          "give until, for, or both");
    }
    Optional<Quantity> until =
        fields.find("until").flatMap(value -> quantities.quantity(value, InputKind.PRESSURE));
    Optional<Quantity> longest =
        fields.find("for").flatMap(value -> quantities.quantity(value, InputKind.DURATION));
    OptionalDouble duration =
        longest.map(time -> OptionalDouble.of(time.si().nominal())).orElse(OptionalDouble.empty());
    return diameter.flatMap(
        bore ->
            coefficient.map(
                share ->
                    new Driven(
                        new Drive.Orifice(bore.si(), share.si(), until.map(Quantity::si), duration),
                        until)));
  }
}
