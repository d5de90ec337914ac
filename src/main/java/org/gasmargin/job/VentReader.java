package org.gasmargin.job;

import java.util.Optional;
import org.gasmargin.process.Step;
import org.gasmargin.units.Quantity;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Value;

/** Reads {@code vent}. */
final class VentReader {
  private final Plant plant;
  private final Pressures pressures;
  private final Quantities quantities;
  private final Issues issues;

  VentReader(Plant plant, Pressures pressures, Quantities quantities) {
    this.plant = plant;
    this.pressures = pressures;
    this.quantities = quantities;
    issues = quantities.issues();
  }

  /** The step, or empty after an issue was added. */
  Optional<Step> read(String id, Value value) {
    return Fields.of(value, issues, "vessel", "through", "until", "within", "mass_flow", "for")
        .flatMap(fields -> vent(id, fields));
  }

  private Optional<Step> vent(String id, Fields fields) {
    Optional<String> vessel = plant.vesselOf(fields);
    DriveReader drives = new DriveReader(quantities);
    Optional<DriveReader.Driven> driven =
        fields.has("through") ? drives.orifice(fields) : drives.rampOrMassFlow(fields);
    vessel.ifPresent(name -> follow(name, fields, driven.flatMap(DriveReader.Driven::until)));
    return vessel.flatMap(name -> driven.map(flow -> new Step.Vent(id, name, flow.drive())));
  }

  private void follow(String vessel, Fields fields, Optional<Quantity> until) {
    if (until.isEmpty()) {
      pressures.forget(vessel);
      return;
    }
    Value target = fields.find("until").orElseThrow();
    pressures.mustFall(vessel, until.get(), target.place());
    if (until.get().si().nominal() < quantities.atmosphere()) {
      issues.add(
          target.place(),
          until.get().typed() + " is below the atmosphere, into which the vessel is vented");
    }
    if (fields.has("for")) {
      pressures.forget(vessel);
    }
  }
}
