package org.gasmargin.rules;

/** How far a figure or a rule may be trusted. */
public enum SourceStatus {
  /** Published, and read in the text that is named. */
  PUBLISHED("published"),
  /** Read in a text that quotes the standard and is not the standard itself. */
  CONFIRMED_SECONDARY("confirmed, secondary"),
  /** What competent people usually do. */
  COMMON_PRACTICE("common practice, no source"),
  /** Named from knowledge of the trade and not read: a starting value. */
  FROM_MEMORY("from memory"),
  /** Follows from definitions and physics alone. */
  DEFINITION("definition"),
  /** Set by the owner of the rule for his own site. */
  SITE_RULE("site rule");

  private final String words;

  SourceStatus(String words) {
    this.words = words;
  }

  /** The words in a rule pack and on the worksheet. */
  public String words() {
    return words;
  }
}
