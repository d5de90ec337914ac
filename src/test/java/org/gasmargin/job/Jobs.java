package org.gasmargin.job;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.rules.Limit;
import org.gasmargin.vessel.MaterialCatalogue;
import org.gasmargin.vessel.Vessel;

/** Job texts for tests and the reader that reads them. */
final class Jobs {
  static final List<String> RULE_PACKS =
      List.of("general", "cylinder_fill", "oxygen", "hydrogen", "cold_vent");
  static final JobReader READER =
      new JobReader(new GasCatalogue(), MaterialCatalogue.load(), RULE_PACKS);

  private Jobs() {}

  static Job resource(String name) {
    return READER.read(name.substring(name.lastIndexOf('/') + 1), text(name));
  }

  static Vessel vessel(Job job, String name) {
    return job.procedure().vessels().stream()
        .filter(vessel -> vessel.name().equals(name))
        .findFirst()
        .orElseThrow();
  }

  static List<Limit> limits(Job job, String vessel) {
    return job.limits().getOrDefault(vessel, List.of());
  }

  static String sampleText(String name) {
    try {
      return Files.readString(Path.of("sample-jobs", name + ".yaml"));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static String text(String resource) {
    try (InputStream stream = Jobs.class.getResourceAsStream(resource)) {
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
