package org.gasmargin.rules;

/**
 * What an example of a rule gave.
 *
 * @param rule identifier of the rule
 * @param example name of the example
 * @param expected the expected word
 * @param got the word that came out
 * @param reason the sentence that came with it
 */
public record ExampleOutcome(
    String rule, String example, String expected, String got, String reason) {

  /** Whether the outcome is the expected one. */
  public boolean holds() {
    return expected.equals(got);
  }
}
