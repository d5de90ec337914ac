package org.gasmargin.job;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.gas.Gas;
import org.gasmargin.units.Quantity;

/** Reads {@code gas}: a name, or a map of names with their shares. */
final class GasReader {
  private static final double ROUNDING = 1e-4;

  private final GasNames gases;
  private final Quantities quantities;
  private final Issues issues;

  GasReader(GasNames gases, Quantities quantities) {
    this.gases = gases;
    this.quantities = quantities;
    issues = quantities.issues();
  }

  /** The gas, or empty after an issue was added. */
  Optional<Gas> read(Value value) {
    return value.node() instanceof YamlNode.Table ? mixture(value) : pure(value);
  }

  private Optional<Gas> pure(Value value) {
    return Texts.word(value, issues).flatMap(name -> find(value, name));
  }

  private Optional<Gas> find(Value value, String name) {
    Optional<Gas> gas = gases.find().apply(name);
    if (gas.isEmpty()) {
      Texts.unknown(value, "gas", name, gases.names(), issues);
    }
    return gas;
  }

  private Optional<Gas> mixture(Value value) {
    Fields fields = Fields.named(value, issues).orElseThrow();
    Map<Gas, Double> shares = new LinkedHashMap<>();
    for (Map.Entry<String, Value> component : fields.all().entrySet()) {
      Value typed = component.getValue();
      Optional<Gas> gas =
          find(
              new Value(value.path(), typed.key(), keyNode(typed, component.getKey())),
              component.getKey());
      Optional<Quantity> share = quantities.quantity(typed, InputKind.SHARE);
      gas.ifPresent(
          found -> share.ifPresent(part -> shares.merge(found, part.si().nominal(), Double::sum)));
    }
    if (shares.size() < fields.all().size() || shares.isEmpty()) {
      if (fields.all().isEmpty()) {
        issues.add(value.place(), value.path() + " names no gas");
      }
      return Optional.empty();
    }
    return whole(value, shares);
  }

  private Optional<Gas> whole(Value value, Map<Gas, Double> shares) {
    double sum = shares.values().stream().mapToDouble(Double::doubleValue).sum();
    if (Math.abs(sum - 1) > ROUNDING) {
      issues.add(
          value.place(),
          String.format(
              java.util.Locale.ROOT,
              "the shares of %s add up to %.4g %%, not to 100 %%",
              value.path(),
              sum * 100));
      return Optional.empty();
    }
    if (shares.size() > 1) {
      issues.add(
          value.place(),
          "mixtures of gases are not computed by this version, and a mixture is never treated as"
              + " one of its parts",
          "name one gas, for example \"gas: air\"");
      return Optional.empty();
    }
    return shares.keySet().stream().findFirst();
  }

  private static YamlNode keyNode(Value typed, String name) {
    return new YamlNode.Text(typed.key(), name, false);
  }
}
