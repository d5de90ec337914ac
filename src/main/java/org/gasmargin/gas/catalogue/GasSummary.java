package org.gasmargin.gas.catalogue;

import java.util.List;

/**
 * One line of the catalogue.
 *
 * @param id identifier used in job files
 * @param name name for people
 * @param formula chemical formula
 * @param synonyms other names that are understood, trade names among them
 */
public record GasSummary(String id, String name, String formula, List<String> synonyms) {
  /** Copies the list. */
  public GasSummary {
    synonyms = List.copyOf(synonyms);
  }
}
