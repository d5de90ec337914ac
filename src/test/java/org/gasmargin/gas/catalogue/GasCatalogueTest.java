package org.gasmargin.gas.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.Hazard;
import org.junit.jupiter.api.Test;

class GasCatalogueTest {
  private final GasCatalogue catalogue = new GasCatalogue();

  @Test
  void everyListedGasLoadsAndIsFoundByEachOfItsNames() {
    List<String> ids = catalogue.list().stream().map(GasSummary::id).toList();
    assertTrue(
        ids.containsAll(
            List.of("nitrogen", "oxygen", "argon", "air", "helium", "hydrogen", "methane")));
    for (GasSummary summary : catalogue.list()) {
      Gas gas = catalogue.find(summary.id()).orElseThrow();
      assertEquals(summary.id(), gas.id());
      assertEquals(summary.id(), GasResources.gas(summary.id()).text("id"));
      assertFalse(gas.citation().isBlank());
      Stream.concat(Stream.of(summary.name(), summary.formula()), summary.synonyms().stream())
          .forEach(name -> assertSame(gas, catalogue.find(name).orElseThrow(), name));
    }
  }

  @Test
  void noNameBelongsToTwoGases() {
    Map<String, String> owners = new HashMap<>();
    for (GasSummary summary : catalogue.list()) {
      for (String name : summary.synonyms()) {
        String owner = owners.put(name.toLowerCase(Locale.ROOT), summary.id());
        assertTrue(owner == null || owner.equals(summary.id()), name);
      }
    }
  }

  @Test
  void caseBlanksAndHyphensMakeNoDifference() {
    assertEquals("nitrogen", catalogue.find(" NITROGEN ").orElseThrow().id());
    assertEquals("nitrogen", catalogue.find("oxygen free nitrogen").orElseThrow().id());
    assertEquals("air", catalogue.find("Breathing_Air").orElseThrow().id());
  }

  @Test
  void unknownNamesAreNotFoundAndCloseNamesAreOffered() {
    assertTrue(catalogue.find("nitrogn").isEmpty());
    assertTrue(catalogue.find("").isEmpty());
    assertEquals("nitrogen", catalogue.suggestions("nitrogn").get(0));
    assertEquals("oxygen", catalogue.suggestions("oxigen").get(0));
    assertEquals(List.of(), catalogue.suggestions("unobtainium chloride"));
  }

  @Test
  void hazardsComeFromTheData() {
    assertTrue(catalogue.find("oxygen").orElseThrow().hazards().contains(Hazard.OXIDISER));
    assertTrue(catalogue.find("hydrogen").orElseThrow().hazards().contains(Hazard.FLAMMABLE));
    assertTrue(catalogue.find("argon").orElseThrow().hazards().contains(Hazard.ASPHYXIANT));
  }

  @Test
  void oxygenIsFittedOnlyTo300Kelvin() {
    // Title of Stewart, Jacobsen, Wagner, J. Phys. Chem. Ref. Data 20, 917 (1991): published.
    assertEquals(
        300, catalogue.find("oxygen").orElseThrow().validity().fittedMaxTemperature(), 0.0);
  }
}
