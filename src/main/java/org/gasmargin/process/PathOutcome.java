package org.gasmargin.process;

/** A path, or the reason why there is none. */
public sealed interface PathOutcome {

  /** The path was computed over the whole step. */
  record Computed(Path path) implements PathOutcome {}

  /**
   * The path does not belong to this kind of step, or needs an input that the job does not give.
   *
   * @param reason in plain words
   */
  record Absent(String reason) implements PathOutcome {}

  /**
   * The calculation left its validity: nothing about it may pass.
   *
   * @param reason in plain words, with quantity, value and range
   */
  record Failed(String reason) implements PathOutcome {}
}
