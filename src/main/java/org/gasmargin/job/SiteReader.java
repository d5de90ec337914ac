package org.gasmargin.job;

import java.util.Optional;
import org.gasmargin.process.Site;
import org.gasmargin.units.Quantity;

/** Reads {@code site}. */
final class SiteReader {
  private SiteReader() {}

  /** The surroundings, or empty after an issue was added. */
  static Optional<Site> read(Value value, Quantities quantities) {
    Issues issues = quantities.issues();
    return Fields.of(value, issues, "ambient_temperature", "atmospheric_pressure")
        .flatMap(
            fields -> {
              Optional<Quantity> ambient =
                  quantities.needed(fields, "ambient_temperature", InputKind.AMBIENT_TEMPERATURE);
              Optional<Quantity> atmosphere =
                  fields.need("atmospheric_pressure").flatMap(v -> barometer(v, quantities));
              return ambient.flatMap(t -> atmosphere.map(p -> new Site(t.si(), p.si())));
            });
  }

  private static Optional<Quantity> barometer(Value value, Quantities quantities) {
    Optional<Quantity> read = quantities.quantity(value, InputKind.ATMOSPHERIC_PRESSURE);
    if (read.filter(pressure -> pressure.unit().isGauge()).isPresent()) {
      quantities
          .issues()
          .add(
              value.place(),
              "the atmosphere itself cannot be a gauge pressure",
              "write for example \"1.013 bar(a)\"");
      return Optional.empty();
    }
    return read;
  }
}
