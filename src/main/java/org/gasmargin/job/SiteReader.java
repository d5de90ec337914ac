package org.gasmargin.job;

import java.util.Optional;
import org.gasmargin.process.Site;
import org.gasmargin.units.Quantity;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Value;

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
                  quantities.needed(fields, "atmospheric_pressure", InputKind.ATMOSPHERIC_PRESSURE);
              return ambient.flatMap(t -> atmosphere.map(p -> new Site(t.si(), p.si())));
            });
  }
}
