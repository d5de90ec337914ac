package org.gasmargin.gas.catalogue;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ConcurrentMap;
import java.util.stream.Stream;
import org.gasmargin.gas.Gas;

/**
 * The gases that come with the program. A gas is read from its data file when it is first asked for
 * and kept by this catalogue; the catalogue may be shared between threads.
 */
public final class GasCatalogue {
  private static final int MOST_SUGGESTIONS = 3;

  private final List<GasSummary> index = GasResources.index();
  private final ConcurrentMap<String, Gas> loaded = new ConcurrentHashMap<>();

  /** What there is, in the order of the index. */
  public List<GasSummary> list() {
    return index;
  }

  /** The gas with this id, name, formula or synonym; upper and lower case are the same. */
  public Optional<Gas> find(String nameOrSynonym) {
    String wanted = normal(nameOrSynonym);
    return index.stream()
        .filter(summary -> names(summary).anyMatch(name -> normal(name).equals(wanted)))
        .findFirst()
        .map(summary -> loaded.computeIfAbsent(summary.id(), id -> GasReader.read(summary)));
  }

  /** Ids and synonyms close to a name that was not found, the closest first, at most three. */
  public List<String> suggestions(String miss) {
    String wanted = normal(miss);
    int reach = Math.max(2, wanted.length() / 3);
    return index.stream()
        .flatMap(GasCatalogue::names)
        .filter(name -> name.length() > 2 && EditDistance.between(normal(name), wanted) <= reach)
        .distinct()
        .sorted(Comparator.comparingInt(name -> EditDistance.between(normal(name), wanted)))
        .limit(MOST_SUGGESTIONS)
        .toList();
  }

  private static Stream<String> names(GasSummary summary) {
    return Stream.concat(
        Stream.of(summary.id(), summary.name(), summary.formula()), summary.synonyms().stream());
  }

  /** Case, blanks, hyphens and underscores make no difference. */
  private static String normal(String name) {
    return name.strip().toLowerCase(Locale.ROOT).replaceAll("[\\s_-]+", " ");
  }
}
