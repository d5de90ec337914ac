package org.gasmargin.job;

import java.util.List;
import java.util.Optional;
import org.gasmargin.rules.Limit;
import org.gasmargin.rules.LimitKind;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;

/** Refuses limits of one vessel that leave nothing between them. */
final class LimitOrder {
  private static final List<Pair> PAIRS =
      List.of(
          new Pair(LimitKind.MIN_PRESSURE, LimitKind.MAX_PRESSURE),
          new Pair(LimitKind.MIN_GAS_TEMPERATURE, LimitKind.MAX_GAS_TEMPERATURE),
          new Pair(LimitKind.MIN_METAL_TEMPERATURE, LimitKind.MAX_METAL_TEMPERATURE),
          new Pair(LimitKind.WORKING_PRESSURE, LimitKind.TEST_PRESSURE));

  private LimitOrder() {}

  private record Pair(LimitKind lower, LimitKind upper) {}

  static void check(Fields fields, List<Limit> limits, Issues issues) {
    for (Pair pair : PAIRS) {
      Optional<Limit> lower = find(pair.lower(), limits);
      Optional<Limit> upper = find(pair.upper(), limits);
      if (lower.isPresent()
          && upper.isPresent()
          && lower.get().value().si().nominal() >= upper.get().value().si().nominal()) {
        issues.add(
            fields.find(pair.lower().key()).orElseThrow().place(),
            pair.lower().key()
                + " "
                + lower.get().value().typed()
                + " is not below "
                + pair.upper().key()
                + " "
                + upper.get().value().typed());
      }
    }
  }

  private static Optional<Limit> find(LimitKind kind, List<Limit> limits) {
    return limits.stream().filter(limit -> limit.kind() == kind).findFirst();
  }
}
