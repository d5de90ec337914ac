package org.gasmargin.gas;

/**
 * A state or a calculation for which the model does not hold: out of range, condensing, or an
 * iteration that did not converge. It is no fault of the program and no error of the user; whoever
 * steps through a process turns it into NOT ASSESSED.
 */
public final class OutsideValidity extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /**
   * @param message one line in plain words, with quantity, value, unit and range
   */
  public OutsideValidity(String message) {
    super(message);
  }
}
