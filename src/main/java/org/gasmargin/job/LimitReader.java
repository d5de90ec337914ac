package org.gasmargin.job;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.rules.Limit;
import org.gasmargin.rules.LimitKind;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Value;
import org.gasmargin.yaml.YamlNode;

/** Reads {@code limits}: each a quantity, or {@code {value: ..., read_from: ..., margin: ...}}. */
final class LimitReader {
  private static final String[] KEYS =
      Arrays.stream(LimitKind.values()).map(LimitKind::key).toArray(String[]::new);

  private final Quantities quantities;
  private final Issues issues;

  LimitReader(Quantities quantities) {
    this.quantities = quantities;
    issues = quantities.issues();
  }

  /** The limits in the order of {@link LimitKind}. */
  List<Limit> read(Value value) {
    List<Limit> limits = new ArrayList<>();
    Fields.of(value, issues, KEYS)
        .ifPresent(
            fields -> {
              for (LimitKind kind : LimitKind.values()) {
                fields.find(kind.key()).flatMap(one -> limit(one, kind)).ifPresent(limits::add);
              }
              LimitOrder.check(fields, limits, issues);
            });
    return limits;
  }

  private Optional<Limit> limit(Value value, LimitKind kind) {
    if (!(value.node() instanceof YamlNode.Table)) {
      return quantities
          .quantity(value, inputKind(kind))
          .map(typed -> new Limit(kind, typed, Optional.empty(), OptionalDouble.empty()));
    }
    return Fields.of(value, issues, "value", "read_from", "margin")
        .flatMap(fields -> sourced(fields, kind));
  }

  private Optional<Limit> sourced(Fields fields, LimitKind kind) {
    OptionalDouble margin =
        fields
            .find("margin")
            .flatMap(typed -> quantities.quantity(typed, marginKind(kind)))
            .map(typed -> OptionalDouble.of(typed.si().nominal()))
            .orElse(OptionalDouble.empty());
    return quantities
        .sourced(fields, inputKind(kind))
        .map(value -> new Limit(kind, value.quantity(), value.readFrom(), margin));
  }

  private static InputKind inputKind(LimitKind kind) {
    return switch (kind.dimension()) {
      case ABSOLUTE_PRESSURE -> InputKind.PRESSURE_LIMIT;
      case TEMPERATURE -> InputKind.TEMPERATURE_LIMIT;
      case PRESSURE_RATE -> InputKind.RATE_LIMIT;
      default -> throw new IllegalStateException("no input kind for " + kind);
    };
  }

  private static InputKind marginKind(LimitKind kind) {
    return switch (kind.dimension()) {
      case ABSOLUTE_PRESSURE -> InputKind.PRESSURE_MARGIN;
      case TEMPERATURE -> InputKind.TEMPERATURE_MARGIN;
      case PRESSURE_RATE -> InputKind.RATE_MARGIN;
      default -> throw new IllegalStateException("no margin kind for " + kind);
    };
  }
}
