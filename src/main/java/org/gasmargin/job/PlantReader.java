package org.gasmargin.job;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.process.Site;
import org.gasmargin.process.Supply;
import org.gasmargin.rules.Limit;
import org.gasmargin.units.Quantity;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;

/** Reads {@code vessels} and {@code supplies}. */
final class PlantReader {
  static final int MOST = 12;

  private final VesselReader vessels;
  private final Quantities quantities;
  private final Plant plant;
  private final Pressures pressures;
  private final Issues issues;

  PlantReader(VesselReader vessels, Quantities quantities, Plant plant, Pressures pressures) {
    this.vessels = vessels;
    this.quantities = quantities;
    this.plant = plant;
    this.pressures = pressures;
    issues = quantities.issues();
  }

  /** Puts the vessels into the plant and gives their limits by name. */
  Map<String, List<Limit>> readVessels(Value value, Optional<Site> site) {
    Map<String, List<Limit>> limits = new LinkedHashMap<>();
    named(value, Plant.VESSEL)
        .forEach(
            (name, one) -> {
              plant.put(name, Optional.empty());
              Fields.of(one, issues, "gas", "volume", "start", "wall", "limits")
                  .ifPresent(
                      fields -> {
                        Optional<Vessel> vessel = vessels.read(fields, name, site);
                        plant.put(name, vessel);
                        vessel.ifPresent(pressures::start);
                        limits.put(
                            name,
                            fields
                                .find("limits")
                                .map(list -> new LimitReader(quantities).read(list))
                                .orElse(List.of()));
                      });
            });
    return limits;
  }

  /** Puts the supplies into the plant. */
  void readSupplies(Value value) {
    named(value, Plant.SUPPLY).forEach((name, one) -> plant.putSupply(name, supply(name, one)));
  }

  private Optional<Supply> supply(String name, Value value) {
    return Fields.of(value, issues, "pressure", "temperature")
        .flatMap(
            fields -> {
              Optional<Quantity> pressure =
                  quantities.needed(fields, "pressure", InputKind.PRESSURE);
              Optional<Quantity> temperature =
                  quantities.needed(fields, "temperature", InputKind.GAS_TEMPERATURE);
              return pressure.flatMap(p -> temperature.map(t -> new Supply(name, p.si(), t.si())));
            });
  }

  private Map<String, Value> named(Value value, String what) {
    Optional<Map<String, Value>> read = Fields.named(value, issues).map(Fields::all);
    Map<String, Value> all = read.orElse(Map.of());
    all.forEach((name, one) -> Texts.isName(one, name, issues));
    if (read.isPresent() && (all.isEmpty() || all.size() > MOST)) {
      issues.add(
          value.key(), value.path() + " holds " + all.size() + ", 1 to " + MOST + " were expected");
    }
    if (all.isEmpty() || all.size() > MOST) {
      plant.markUnreadable(what);
      return Map.of();
    }
    return all;
  }
}
