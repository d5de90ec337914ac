package org.gasmargin.process;

/**
 * The furthest value that a quantity can reach in a step, and the path that leads there.
 *
 * @param value K or Pa absolute, finite
 * @param path the path in words, for example "fill without heat loss, then settled to 20 degC"
 */
public record Extreme(double value, String path) {

  /** Refuses a value that is not finite. */
  public Extreme {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("an extreme needs a finite value");
    }
  }
}
