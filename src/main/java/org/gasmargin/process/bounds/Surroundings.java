package org.gasmargin.process.bounds;

/**
 * The range of temperatures that the wall and the ambient can have in a step.
 *
 * @param coldest K
 * @param hottest K
 */
public record Surroundings(double coldest, double hottest) {

  /** The range that also holds a temperature, K. */
  public Surroundings including(double temperature) {
    return new Surroundings(Math.min(coldest, temperature), Math.max(hottest, temperature));
  }
}
