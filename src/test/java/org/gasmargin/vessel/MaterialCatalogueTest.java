package org.gasmargin.vessel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

class MaterialCatalogueTest {
  private static final MaterialCatalogue CATALOGUE = MaterialCatalogue.load();

  /** Source and status of the ranges stand at the head of the file. */
  @ParameterizedTest
  @CsvFileSource(resources = "/published/wall-materials.csv")
  void figuresLieWithinTheirPublishedRange(
      String name,
      double temperature,
      double conductivityLow,
      double conductivityHigh,
      double densityLow,
      double densityHigh,
      double heatCapacityLow,
      double heatCapacityHigh) {
    Material material = CATALOGUE.find(name).orElseThrow();
    Material.Point point =
        material.points().stream()
            .filter(candidate -> candidate.temperature() == temperature)
            .findFirst()
            .orElseThrow();
    assertWithin(conductivityLow, conductivityHigh, point.conductivity());
    assertWithin(densityLow, densityHigh, material.density());
    assertWithin(heatCapacityLow, heatCapacityHigh, point.heatCapacity());
  }

  @Test
  void everyMaterialStatesItsSourceAndRisesInTemperature() {
    for (String name : CATALOGUE.names()) {
      Material material = CATALOGUE.find(name).orElseThrow();
      assertTrue(
          material.source().endsWith("(value from memory)")
              || material.source().endsWith("(common practice, no source)"),
          material.source());
      List<Double> temperatures =
          material.points().stream().map(Material.Point::temperature).toList();
      assertFalse(temperatures.isEmpty());
      assertEquals(temperatures.stream().sorted().distinct().toList(), temperatures);
    }
  }

  @Test
  void anUnknownMaterialIsNotFound() {
    assertTrue(CATALOGUE.find("unobtainium").isEmpty());
  }

  private static void assertWithin(double low, double high, double value) {
    assertTrue(value >= low && value <= high, value + " is not in " + low + " to " + high);
  }
}
