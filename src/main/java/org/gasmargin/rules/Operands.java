package org.gasmargin.rules;

import java.util.Map;

/**
 * What stands behind each name of the rule language for one step.
 *
 * @param values by name
 */
record Operands(Map<String, Operand> values) {
  /** No operand at all, for constants. */
  static final Operands NONE = new Operands(Map.of());

  Operands {
    values = Map.copyOf(values);
  }

  /** The operand of a name; unknown if there is none. */
  Operand get(String name) {
    Operand value = values.get(name);
    return value == null ? new Operand.Unknown(name + " is not known") : value;
  }
}
