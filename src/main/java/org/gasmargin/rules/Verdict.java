package org.gasmargin.rules;

/** The verdict words, from the best to the worst. */
public enum Verdict {
  WITHIN_LIMITS("WITHIN LIMITS"),
  NOT_ASSESSED("NOT ASSESSED"),
  MARGIN_SHORT("MARGIN SHORT"),
  OVER_LIMIT("OVER LIMIT");

  private final String words;

  Verdict(String words) {
    this.words = words;
  }

  /** The words as printed. */
  public String words() {
    return words;
  }

  /** The worse of two. */
  public Verdict worse(Verdict other) {
    return compareTo(other) >= 0 ? this : other;
  }
}
