package org.gasmargin.job;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.gasmargin.rules.LimitKind;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.Unit;
import org.gasmargin.vessel.MaterialCatalogue;
import org.junit.jupiter.api.Test;

/** The guide to the job file names everything that a user can name. */
class JobFileGuideTest {
  private static final List<Dimension> IN_THE_TABLE_BY_BASE =
      List.of(Dimension.ABSOLUTE_PRESSURE, Dimension.MASS);

  @Test
  void namesEveryUnitMaterialAndLimit() throws IOException {
    String guide = Files.readString(Path.of("docs", "job-file.md"));
    Stream<String> units =
        Arrays.stream(Unit.values())
            .filter(unit -> !IN_THE_TABLE_BY_BASE.contains(unit.dimension()))
            .map(Unit::symbol);
    Stream<String> limits = Arrays.stream(LimitKind.values()).map(LimitKind::key);
    Stream.of(units, limits, MaterialCatalogue.load().names().stream())
        .flatMap(names -> names)
        .forEach(name -> assertTrue(guide.contains(name), name + " is missing in the guide"));
  }
}
