package org.gasmargin.units;

import java.util.Optional;

/** A text that is not the quantity that was expected, with what to write instead. */
public final class QuantityError extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final String hint;

  QuantityError(String problem, String hint) {
    super(problem);
    this.hint = hint;
  }

  /** What is wrong, one line. */
  public String problem() {
    return String.valueOf(getMessage());
  }

  /** What would be right, if there is something to offer. */
  public Optional<String> hint() {
    return hint.isEmpty() ? Optional.empty() : Optional.of(hint);
  }
}
