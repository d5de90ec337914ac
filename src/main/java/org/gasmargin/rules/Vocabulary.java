package org.gasmargin.rules;

import java.util.Collections;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.gasmargin.units.Dimension;

/** The names that expressions can use. */
final class Vocabulary {
  private static final String LIMIT = "limit.";
  private static final String GIVEN = "given.";
  private static final Map<String, Dimension> NUMBERS = numbers();
  private static final Set<String> NAMES = names();

  private Vocabulary() {}

  /** The name of a limit's value. */
  static String limit(LimitKind kind) {
    return LIMIT + kind.key();
  }

  /** The name of the fact that the job gives a limit. */
  static String given(LimitKind kind) {
    return GIVEN + kind.key();
  }

  /** All names. */
  static Set<String> all() {
    return NAMES;
  }

  /** The dimension of a name that stands for a number. */
  static Optional<Dimension> dimension(String name) {
    return Optional.ofNullable(NUMBERS.get(name));
  }

  /** Whether a name stands for a word; if neither for a word nor a number, it is true or false. */
  static boolean isWord(String name) {
    return fact(name).filter(Fact::isWord).isPresent();
  }

  /** Whether an example may give a name a value; that a limit is given follows from its value. */
  static boolean canBeGiven(String name) {
    return NAMES.contains(name) && !name.startsWith(GIVEN);
  }

  /** Whether a name speaks of the gas alone. */
  static boolean isOfGas(String name) {
    return fact(name).filter(Fact::isOfGas).isPresent();
  }

  private static Optional<Fact> fact(String name) {
    for (Fact fact : Fact.values()) {
      if (fact.key().equals(name)) {
        return Optional.of(fact);
      }
    }
    return Optional.empty();
  }

  private static Map<String, Dimension> numbers() {
    Map<String, Dimension> all = new TreeMap<>();
    for (ResultQuantity quantity : ResultQuantity.values()) {
      all.put(quantity.key(), quantity.dimension());
    }
    for (LimitKind kind : LimitKind.values()) {
      all.put(limit(kind), kind.dimension());
    }
    return Collections.unmodifiableMap(all);
  }

  private static Set<String> names() {
    Set<String> all = new TreeSet<>(NUMBERS.keySet());
    for (Fact fact : Fact.values()) {
      all.add(fact.key());
    }
    for (LimitKind kind : LimitKind.values()) {
      all.add(given(kind));
    }
    return Collections.unmodifiableSet(all);
  }
}
