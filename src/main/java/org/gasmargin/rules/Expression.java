package org.gasmargin.rules;

import dev.cel.runtime.CelEvaluationException;
import dev.cel.runtime.CelRuntime;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.gasmargin.units.Dimension;

/** A checked expression of a rule. Evaluating it never throws and never gives a NaN. */
sealed interface Expression {

  /** The expression as written. */
  String text();

  /** Every name in it. */
  Set<String> names();

  /** The dimension of its number; empty if it is true or false. */
  Optional<Dimension> dimension();

  /**
   * The value for given operands. One unknown operand makes the whole unknown, whatever operators
   * stand around it.
   */
  Operand evaluate(Operands operands);

  /** A single figure, or true or false. */
  record Literal(String text, Operand value, Optional<Dimension> dimension) implements Expression {
    @Override
    public Set<String> names() {
      return Set.of();
    }

    @Override
    public Operand evaluate(Operands operands) {
      return value;
    }
  }

  /** A name alone. */
  record Name(String text, Optional<Dimension> dimension) implements Expression {
    @Override
    public Set<String> names() {
      return Set.of(text);
    }

    @Override
    public Operand evaluate(Operands operands) {
      return operands.get(text);
    }
  }

  /** Anything longer, as a program of the expression library. */
  record Compound(
      String text, Set<String> names, Optional<Dimension> dimension, CelRuntime.Program program)
      implements Expression {

    /** Sorts the names, so that reasons always come in the same order. */
    public Compound {
      names = new TreeSet<>(names);
    }

    @Override
    public Operand evaluate(Operands operands) {
      Map<String, Object> variables = new TreeMap<>();
      Set<String> unknown = new LinkedHashSet<>();
      Set<String> paths = new LinkedHashSet<>();
      for (String name : names) {
        Operand operand = operands.get(name);
        if (operand instanceof Operand.Figure figure) {
          variables.put(name, FunctionTable.asCelValue(figure.measure()));
          paths.add(figure.path());
        } else if (operand instanceof Operand.Truth truth) {
          variables.put(name, truth.holds());
        } else if (operand instanceof Operand.Word word) {
          variables.put(name, word.text());
        } else if (operand instanceof Operand.Unknown nothing) {
          unknown.add(nothing.reason());
        }
      }
      paths.remove("");
      return unknown.isEmpty()
          ? run(variables, String.join("; ", paths))
          : new Operand.Unknown(String.join("; ", unknown));
    }

    private Operand run(Map<String, Object> variables, String path) {
      try {
        Object value = program.eval(variables);
        return value instanceof Boolean truth
            ? new Operand.Truth(truth)
            : Operand.number(FunctionTable.asMeasure(value), path, "the value of " + text);
      } catch (CelEvaluationException e) {
        return new Operand.Unknown(text + " cannot be evaluated");
      }
    }
  }
}
