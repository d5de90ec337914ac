package org.gasmargin.rules;

/** What a rule can ask about a step, its vessel and its gas; never unknown. */
public enum Fact {
  STEP_KIND("step_kind", true),
  GAS_ID("gas_id", true),
  OXIDISER("gas.oxidiser", false),
  FLAMMABLE("gas.flammable", false),
  ASPHYXIANT("gas.asphyxiant", false),
  TOXIC("gas.toxic", false),
  TRAPPED("trapped", false),
  HAS_WALL("has_wall", false),
  LINER_IS_POLYMER("liner_is_polymer", false);

  private final String key;
  private final boolean word;

  Fact(String key, boolean word) {
    this.key = key;
    this.word = word;
  }

  /** The name in rule expressions. */
  public String key() {
    return key;
  }

  /** Whether it is a word; if not, it is true or false. */
  public boolean isWord() {
    return word;
  }

  /** Whether it speaks of the gas alone. */
  boolean isOfGas() {
    return this == GAS_ID || key.startsWith("gas.");
  }
}
