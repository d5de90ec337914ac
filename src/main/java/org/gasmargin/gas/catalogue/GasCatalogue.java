package org.gasmargin.gas.catalogue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ConcurrentMap;
import java.util.stream.Stream;
import org.gasmargin.gas.Gas;
import org.gasmargin.units.NearestName;

/**
 * The gases that come with the program. A gas is read from its data file when it is first asked for
 * and kept by this catalogue; the catalogue may be shared between threads.
 */
public final class GasCatalogue {
  private static final int MOST_SUGGESTIONS = 3;

  private final List<GasSummary> index = GasResources.index();
  private final ConcurrentMap<String, Gas> fluids = new ConcurrentHashMap<>();
  private final ConcurrentMap<String, Gas> gases = new ConcurrentHashMap<>();

  /** What there is, in the order of the index. */
  public List<GasSummary> list() {
    return index;
  }

  /**
   * The fluid with this id, name, formula or synonym, as gas or liquid; upper and lower case are
   * the same.
   */
  public Optional<Gas> find(String nameOrSynonym) {
    return summary(nameOrSynonym)
        .map(
            summary ->
                fluids.computeIfAbsent(
                    summary.id(), id -> GasReader.read(summary, PhaseReader::boundary)));
  }

  /**
   * The same as gas alone: it refuses liquid as it refuses what lies between gas and liquid, so
   * that a calculation made for gas ends where the gas would condense.
   */
  public Optional<Gas> findGas(String nameOrSynonym) {
    return summary(nameOrSynonym)
        .map(
            summary ->
                gases.computeIfAbsent(
                    summary.id(), id -> GasReader.read(summary, PhaseReader::gasSide)));
  }

  private Optional<GasSummary> summary(String nameOrSynonym) {
    String wanted = normal(nameOrSynonym);
    return index.stream()
        .filter(summary -> names(summary).anyMatch(name -> normal(name).equals(wanted)))
        .findFirst();
  }

  /** Names and synonyms close to a name that was not found, the closest first, at most three. */
  public List<String> suggestions(String miss) {
    Map<String, String> known = new HashMap<>();
    index.stream().flatMap(GasCatalogue::names).forEach(name -> known.put(normal(name), name));
    String wanted = normal(miss);
    List<String> suggestions = new ArrayList<>();
    Optional<String> next = NearestName.of(wanted, known.keySet());
    while (next.isPresent() && suggestions.size() < MOST_SUGGESTIONS) {
      next.map(known::remove).ifPresent(suggestions::add);
      next = NearestName.of(wanted, known.keySet());
    }
    return suggestions;
  }

  private static Stream<String> names(GasSummary summary) {
    return Stream.concat(
        Stream.of(summary.name(), summary.formula(), summary.id()), summary.synonyms().stream());
  }

  /** Case, blanks, hyphens and underscores make no difference. */
  private static String normal(String name) {
    return name.strip().toLowerCase(Locale.ROOT).replaceAll("[\\s_-]+", " ");
  }
}
