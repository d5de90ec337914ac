package org.gasmargin.job;

import java.util.ArrayList;
import java.util.List;
import org.gasmargin.process.Step;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Lists;
import org.gasmargin.yaml.Value;

/** Reads {@code steps}: a list of maps, each with the one word that names the kind of step. */
final class StepReader {
  static final int MOST_STEPS = 100;

  private static final List<String> KINDS = List.of("fill", "vent", "hold", "compress");

  private final FillReader fills;
  private final VentReader vents;
  private final ClosedStepReader closed;
  private final Issues issues;

  StepReader(Plant plant, Pressures pressures, Quantities quantities) {
    issues = quantities.issues();
    fills = new FillReader(plant, pressures, quantities);
    vents = new VentReader(plant, pressures, quantities);
    closed = new ClosedStepReader(plant, pressures, quantities);
  }

  /** The steps in order; a step that cannot be read is left out after an issue was added. */
  List<Step> read(Value value) {
    List<Step> steps = new ArrayList<>();
    int number = 0;
    for (Value item : Lists.items(value, 1, MOST_STEPS, issues)) {
      String id = String.valueOf(++number);
      Fields.of(item, issues, KINDS.toArray(String[]::new))
          .ifPresent(fields -> steps.addAll(step(id, fields)));
    }
    return steps;
  }

  private List<Step> step(String id, Fields fields) {
    List<String> given = KINDS.stream().filter(fields::has).toList();
    if (given.size() != 1) {
      if (given.size() > 1 || fields.all().isEmpty()) {
        issues.add(
            fields.owner().place(),
            fields.owner().path() + " holds " + given.size() + " kinds of step, not one",
            "begin each step with a dash of its own");
      }
      return List.of();
    }
    Value body = fields.find(given.get(0)).orElseThrow();
    return switch (given.get(0)) {
      case "fill" -> fills.read(id, body).stream().toList();
      case "vent" -> vents.read(id, body).stream().toList();
      case "hold" -> closed.hold(id, body);
      default -> closed.compress(id, body).stream().toList();
    };
  }
}
