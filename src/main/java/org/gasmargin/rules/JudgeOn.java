package org.gasmargin.rules;

/** What the rules look at. */
public enum JudgeOn {
  /** The envelope of the bounding paths: no credit for heat taken by the wall. */
  BOUNDS,
  /**
   * The modelled path with its uncertainty: a choice of the user that is printed at the verdict.
   */
  MODELLED
}
