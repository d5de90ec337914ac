package org.gasmargin.process;

import java.util.Optional;

/**
 * The furthest value that a quantity can reach in a step, and the path that leads there.
 *
 * @param value K or Pa absolute, finite
 * @param path the path in words, for example "fill without heat loss, then settled to 20 degC"
 * @param stretch the last stretch of that path; empty if nothing moved on it or if heat passed
 */
public record Extreme(double value, String path, Optional<Stretch> stretch) {

  /** Refuses a value that is not finite. */
  public Extreme {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("an extreme needs a finite value");
    }
  }

  /** An extreme whose last stretch is not told. */
  public Extreme(double value, String path) {
    this(value, path, Optional.empty());
  }
}
