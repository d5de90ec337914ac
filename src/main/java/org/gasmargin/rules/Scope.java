package org.gasmargin.rules;

/** Which names an expression may use. */
enum Scope {
  /** All that is known of a step. */
  STEP("everything that is known of a step"),
  /** Properties of the gas. */
  GAS("properties of the gas"),
  /** No name at all. */
  CONSTANT("figures, as in K(5.0) or bar_a(200.0)");

  private final String words;

  Scope(String words) {
    this.words = words;
  }

  /** What may be used, in words. */
  String words() {
    return words;
  }

  /** Whether a name of the vocabulary may be used. */
  boolean permits(String name) {
    return switch (this) {
      case STEP -> true;
      case GAS -> Vocabulary.isOfGas(name);
      case CONSTANT -> false;
    };
  }
}
