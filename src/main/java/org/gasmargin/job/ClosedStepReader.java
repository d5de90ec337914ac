package org.gasmargin.job;

import java.util.List;
import java.util.Optional;
import org.gasmargin.process.Step;
import org.gasmargin.process.Supply;
import org.gasmargin.units.Interval;
import org.gasmargin.units.Quantity;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Value;

/** Reads {@code hold} and {@code compress}. */
final class ClosedStepReader {
  private final Plant plant;
  private final Pressures pressures;
  private final Quantities quantities;
  private final Issues issues;

  ClosedStepReader(Plant plant, Pressures pressures, Quantities quantities) {
    this.plant = plant;
    this.pressures = pressures;
    this.quantities = quantities;
    issues = quantities.issues();
  }

  /** A hold of one vessel, or one for each vessel if it names none. */
  List<Step> hold(String id, Value value) {
    return Fields.of(value, issues, "vessel", "for")
        .map(fields -> holds(id, fields))
        .orElse(List.of());
  }

  private List<Step> holds(String id, Fields fields) {
    Optional<Double> duration = quantities.number(fields, "for", InputKind.DURATION);
    boolean all = !fields.has("vessel") && plant.vesselNames().size() > 1;
    List<String> vessels =
        all ? plant.vesselNames() : plant.vesselOf(fields).map(List::of).orElse(List.of());
    vessels.forEach(pressures::forget);
    return duration.stream()
        .flatMap(
            time ->
                vessels.stream()
                    .map(name -> (Step) new Step.Hold(all ? id + "." + name : id, name, time)))
        .toList();
  }

  /** A sudden compression up to a pressure or to that of a supply. */
  Optional<Step> compress(String id, Value value) {
    return Fields.of(value, issues, "vessel", "from", "until", "within")
        .flatMap(fields -> compress(id, fields));
  }

  private Optional<Step> compress(String id, Fields fields) {
    Optional<String> vessel = plant.vesselOf(fields);
    Optional<Supply> supply = fields.find("from").flatMap(plant::supply);
    Optional<Quantity> until =
        fields.find("until").flatMap(value -> quantities.quantity(value, InputKind.PRESSURE));
    Optional<Double> within =
        fields.has("within")
            ? quantities.number(fields, "within", InputKind.RISE_TIME)
            : Optional.of(0.0);
    if (!fields.has("from") && !fields.has("until")) {
      issues.add(
          fields.owner().key(),
          fields.owner().path() + " does not say up to which pressure",
          "give until, or from with the name of a supply");
    }
    vessel.ifPresent(name -> follow(name, fields, until, supply));
    Optional<Interval> end =
        fields.has("until") ? until.map(Quantity::si) : supply.map(Supply::pressure);
    if (vessel.isEmpty()
        || within.isEmpty()
        || end.isEmpty()
        || fields.has("from") != supply.isPresent()) {
      return Optional.empty();
    }
    return Optional.of(new Step.Compress(id, vessel.get(), end.get(), within.get()));
  }

  private void follow(
      String vessel, Fields fields, Optional<Quantity> until, Optional<Supply> supply) {
    if (until.isPresent()) {
      Value target = fields.find("until").orElseThrow();
      pressures.mustRise(vessel, until.get(), target.place());
      supply.ifPresent(source -> pressures.mustNotExceed(source, until.get(), target.place()));
    } else if (supply.isPresent() && !fields.has("until")) {
      pressures.mustRise(vessel, supply.get(), fields.find("from").orElseThrow().place());
    } else {
      pressures.forget(vessel);
    }
  }
}
