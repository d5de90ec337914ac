package org.gasmargin.rules;

/** What it means when a rule is broken, the worst first. */
public enum Severity {
  /** People can be hurt. */
  DANGER("danger"),
  /** Equipment can be harmed, or has to be inspected before it is used again. */
  DAMAGE("damage"),
  /** Good to know; nothing breaks. */
  INFORMATION("information");

  private final String key;

  Severity(String key) {
    this.key = key;
  }

  /** The word in a rule pack. */
  public String key() {
    return key;
  }
}
