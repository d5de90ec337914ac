package org.gasmargin.job;

import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.process.Step;
import org.gasmargin.process.Supply;
import org.gasmargin.units.Quantity;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Value;

/** Reads {@code fill}. */
final class FillReader {
  private final Plant plant;
  private final Pressures pressures;
  private final Quantities quantities;
  private final Issues issues;

  FillReader(Plant plant, Pressures pressures, Quantities quantities) {
    this.plant = plant;
    this.pressures = pressures;
    this.quantities = quantities;
    issues = quantities.issues();
  }

  /** The step, or empty after an issue was added. */
  Optional<Step> read(String id, Value value) {
    return Fields.of(
            value, issues, "vessel", "from", "until", "within", "mass_flow", "for", "inlet")
        .flatMap(fields -> fill(id, fields));
  }

  private Optional<Step> fill(String id, Fields fields) {
    Optional<String> vessel = plant.vesselOf(fields);
    Optional<Supply> supply = fields.need("from").flatMap(plant::supply);
    Optional<DriveReader.Driven> driven = new DriveReader(quantities).rampOrMassFlow(fields);
    Optional<Double> inlet = fields.find("inlet").flatMap(this::inlet);
    vessel.ifPresent(name -> follow(name, fields, driven, supply));
    if (vessel.isEmpty()
        || supply.isEmpty()
        || driven.isEmpty()
        || fields.has("inlet") != inlet.isPresent()) {
      return Optional.empty();
    }
    OptionalDouble bore = inlet.map(OptionalDouble::of).orElse(OptionalDouble.empty());
    return Optional.of(new Step.Fill(id, vessel.get(), supply.get(), driven.get().drive(), bore));
  }

  private Optional<Double> inlet(Value value) {
    return Fields.of(value, issues, "diameter")
        .flatMap(fields -> quantities.number(fields, "diameter", InputKind.INLET_DIAMETER));
  }

  private void follow(
      String vessel, Fields fields, Optional<DriveReader.Driven> driven, Optional<Supply> supply) {
    Optional<Quantity> until = driven.flatMap(DriveReader.Driven::until);
    if (until.isEmpty()) {
      pressures.forget(vessel);
      return;
    }
    Value target = fields.find("until").orElseThrow();
    pressures.mustRise(vessel, until.get(), target.place());
    supply.ifPresent(source -> pressures.mustNotExceed(source, until.get(), target.place()));
  }
}
