package org.gasmargin.rules;

/** What stands behind a name in an expression, or what an expression gives. */
sealed interface Operand {

  /**
   * A finite number.
   *
   * @param measure the number
   * @param path the path that leads to it, in words; may be empty
   */
  record Figure(Measure measure, String path) implements Operand {
    /** Refuses a number that is not finite. */
    public Figure {
      if (!Double.isFinite(measure.si())) {
        throw new IllegalArgumentException("a known number is finite");
      }
    }

    double si() {
      return measure.si();
    }
  }

  /** True or false. */
  record Truth(boolean holds) implements Operand {}

  /** A word, for example the kind of a step. */
  record Word(String text) implements Operand {}

  /**
   * Nothing that may be calculated with.
   *
   * @param reason why, in plain words without a full stop
   */
  record Unknown(String reason) implements Operand {}

  /** A number if it is one, unknown if it is not finite: the door that no NaN passes. */
  static Operand number(Measure measure, String path, String what) {
    return Double.isFinite(measure.si())
        ? new Figure(measure, path)
        : new Unknown(what + " is not a finite number");
  }
}
