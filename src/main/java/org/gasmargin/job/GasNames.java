package org.gasmargin.job;

import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.gasmargin.gas.Gas;

/**
 * The gases that a job can name.
 *
 * @param find the gas of a name
 * @param names all names, to offer one for a misspelled name
 */
public record GasNames(Function<String, Optional<Gas>> find, Collection<String> names) {

  /** Copies the names. */
  public GasNames {
    names = List.copyOf(names);
  }
}
