package org.gasmargin.job;

import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.gasmargin.process.Supply;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;

/**
 * The vessels and supplies that steps can name. One that could not be read is there by its name, so
 * that a step that names it is not reported as well.
 */
final class Plant {
  static final String VESSEL = "vessel";
  static final String SUPPLY = "supply";

  private final Map<String, Optional<Vessel>> vessels = new LinkedHashMap<>();
  private final Map<String, Optional<Supply>> supplies = new LinkedHashMap<>();
  private final Set<String> unreadable = new HashSet<>();
  private final Issues issues;

  Plant(Issues issues) {
    this.issues = issues;
  }

  void put(String name, Optional<Vessel> vessel) {
    vessels.put(name, vessel);
  }

  void putSupply(String name, Optional<Supply> supply) {
    supplies.put(name, supply);
  }

  /** Notes that vessels or supplies could not be read at all, so that no name is unknown. */
  void markUnreadable(String what) {
    unreadable.add(what);
  }

  /** The vessels that could be read, in the order of the file. */
  List<Vessel> vessels() {
    return vessels.values().stream().flatMap(Optional::stream).toList();
  }

  List<String> vesselNames() {
    return List.copyOf(vessels.keySet());
  }

  /** The vessel of that name if it could be read. */
  Optional<Vessel> vessel(String name) {
    return vessels.getOrDefault(name, Optional.empty());
  }

  /** The name of the vessel on which a step acts: the one named, or the only one. */
  Optional<String> vesselOf(Fields step) {
    if (step.has("vessel")) {
      return step.find("vessel").flatMap(value -> known(value, VESSEL, vesselNames()));
    }
    if (vessels.size() > 1) {
      issues.add(
          step.owner().key(),
          "missing key 'vessel' " + step.owner().within(),
          "the job has several: " + String.join(", ", vesselNames()));
    }
    return vessels.size() == 1 ? Optional.of(vesselNames().get(0)) : Optional.empty();
  }

  /** The supply that a value names. */
  Optional<Supply> supply(Value value) {
    return known(value, SUPPLY, List.copyOf(supplies.keySet()))
        .flatMap(name -> supplies.getOrDefault(name, Optional.empty()));
  }

  private Optional<String> known(Value value, String what, List<String> names) {
    Optional<String> name = Texts.word(value, issues);
    if (name.isPresent() && !names.contains(name.get())) {
      if (!unreadable.contains(what)) {
        Texts.unknown(value, what, name.get(), names, issues);
      }
      return Optional.empty();
    }
    return name;
  }
}
