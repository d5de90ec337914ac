package org.gasmargin.job;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.gas.catalogue.GasSummary;
import org.gasmargin.units.Place;
import org.gasmargin.units.Quantity;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Printable;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;
import org.gasmargin.yaml.YamlNode;

/** Reads {@code gas}: a name, or a map of names with their shares. */
final class GasReader {
  private static final double ROUNDING = 1e-4;

  private final GasCatalogue gases;
  private final Quantities quantities;
  private final Issues issues;

  GasReader(GasCatalogue gases, Quantities quantities) {
    this.gases = gases;
    this.quantities = quantities;
    issues = quantities.issues();
  }

  /** The gas, or empty after an issue was added. */
  Optional<Gas> read(Value value) {
    return value.node() instanceof YamlNode.Table ? mixture(value) : pure(value);
  }

  private Optional<Gas> pure(Value value) {
    return Texts.word(value, issues).flatMap(name -> find(value.place(), value.path(), name));
  }

  private Optional<Gas> find(Place place, String path, String name) {
    Optional<Gas> gas = gases.findGas(name);
    if (gas.isEmpty()) {
      List<String> near = gases.suggestions(name);
      issues.add(
          place,
          "unknown gas " + Printable.quote(name) + " for " + path,
          near.isEmpty()
              ? "known are " + String.join(", ", gases.list().stream().map(GasSummary::id).toList())
              : "did you mean '" + near.get(0) + "'?");
    }
    return gas;
  }

  private Optional<Gas> mixture(Value value) {
    Map<String, Value> components = Fields.named(value, issues).map(Fields::all).orElseThrow();
    if (components.isEmpty()) {
      issues.add(value.place(), value.path() + " names no gas");
    }
    Set<Gas> found = new LinkedHashSet<>();
    double sum = 0;
    int complete = 0;
    for (Map.Entry<String, Value> component : components.entrySet()) {
      Value share = component.getValue();
      Optional<Gas> gas = find(share.key(), value.path(), component.getKey());
      Optional<Quantity> part = quantities.quantity(share, InputKind.SHARE);
      if (gas.isPresent() && part.isPresent()) {
        found.add(gas.get());
        sum += part.get().si().nominal();
        complete++;
      }
    }
    return complete == components.size() && complete > 0
        ? single(value, found, sum)
        : Optional.empty();
  }

  private Optional<Gas> single(Value value, Set<Gas> found, double sum) {
    if (Math.abs(sum - 1) > ROUNDING) {
      issues.add(
          value.place(),
          String.format(
              Locale.ROOT,
              "the shares of %s add up to %.4g %%, not to 100 %%",
              value.path(),
              sum * 100));
      return Optional.empty();
    }
    if (found.size() > 1) {
      issues.add(
          value.place(),
          "mixtures of gases are not computed by this version, and a mixture is never treated as"
              + " one of its parts",
          "name one gas, for example \"gas: air\"");
      return Optional.empty();
    }
    return found.stream().findFirst();
  }
}
