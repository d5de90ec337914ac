package org.gasmargin.rules;

/** On which side of its limit a quantity has to stay. */
public enum Direction {
  AT_MOST("at_most"),
  AT_LEAST("at_least");

  private final String key;

  Direction(String key) {
    this.key = key;
  }

  /** The word in a rule pack. */
  public String key() {
    return key;
  }

  /**
   * Distance from a value to its limit.
   *
   * @return positive inside the limit
   */
  double margin(double limit, double predicted) {
    return this == AT_MOST ? limit - predicted : predicted - limit;
  }

  /** Whether {@code candidate} asks less of the gas than {@code reference}. */
  boolean isLooser(double candidate, double reference) {
    return margin(candidate, reference) > 0;
  }
}
