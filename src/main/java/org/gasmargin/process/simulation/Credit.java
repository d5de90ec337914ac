package org.gasmargin.process.simulation;

/** Whether the modelled path is to be credited, which needs its uncertainty. */
public enum Credit {
  /** The modelled path is shown as information. */
  NONE,
  /** The modelled path is judged, with its uncertainty set against the user. */
  MODELLED
}
