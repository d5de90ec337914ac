package org.gasmargin.rules;

import static org.gasmargin.units.Dimension.ABSOLUTE_PRESSURE;
import static org.gasmargin.units.Dimension.PRESSURE_DIFFERENCE;
import static org.gasmargin.units.Dimension.PRESSURE_RATE;
import static org.gasmargin.units.Dimension.RATIO;
import static org.gasmargin.units.Dimension.TEMPERATURE;
import static org.gasmargin.units.Dimension.TEMPERATURE_DIFFERENCE;
import static org.gasmargin.units.Dimension.TIME;

import java.util.ArrayList;
import java.util.List;
import org.gasmargin.units.Dimension;

/**
 * Which dimensions may meet in which operation. Pressures and temperatures are points on a scale:
 * two of them give a difference, and neither may be multiplied.
 */
final class Arithmetic {
  /** The dimensions of the rule language. */
  static final List<Dimension> DIMENSIONS =
      List.of(
          ABSOLUTE_PRESSURE,
          PRESSURE_DIFFERENCE,
          TEMPERATURE,
          TEMPERATURE_DIFFERENCE,
          PRESSURE_RATE,
          TIME,
          RATIO);

  private Arithmetic() {}

  /** The four operations. */
  enum Operator {
    PLUS("_+_"),
    MINUS("_-_"),
    TIMES("_*_"),
    OVER("_/_");

    private final String function;

    Operator(String function) {
      this.function = function;
    }

    /** The name of the operation in the expression library. */
    String function() {
      return function;
    }

    /** The result, which is not finite where mathematics has none. */
    double apply(double left, double right) {
      return switch (this) {
        case PLUS -> left + right;
        case MINUS -> left - right;
        case TIMES -> left * right;
        case OVER -> left / right;
      };
    }
  }

  /** One permitted meeting of two dimensions. */
  record Operation(Operator operator, Dimension left, Dimension right, Dimension result) {}

  /** All permitted operations. */
  static List<Operation> operations() {
    List<Operation> all = new ArrayList<>();
    for (Dimension dimension : DIMENSIONS) {
      if (dimension.difference() != dimension) {
        addPoint(all, dimension, dimension.difference());
      } else {
        addLinear(all, dimension);
      }
    }
    all.add(new Operation(Operator.OVER, PRESSURE_DIFFERENCE, TIME, PRESSURE_RATE));
    all.add(new Operation(Operator.OVER, PRESSURE_DIFFERENCE, PRESSURE_RATE, TIME));
    all.add(new Operation(Operator.TIMES, PRESSURE_RATE, TIME, PRESSURE_DIFFERENCE));
    all.add(new Operation(Operator.TIMES, TIME, PRESSURE_RATE, PRESSURE_DIFFERENCE));
    return all;
  }

  private static void addPoint(List<Operation> all, Dimension point, Dimension difference) {
    all.add(new Operation(Operator.MINUS, point, point, difference));
    all.add(new Operation(Operator.MINUS, point, difference, point));
    all.add(new Operation(Operator.PLUS, point, difference, point));
    all.add(new Operation(Operator.PLUS, difference, point, point));
    all.add(new Operation(Operator.OVER, point, point, RATIO));
  }

  private static void addLinear(List<Operation> all, Dimension linear) {
    all.add(new Operation(Operator.MINUS, linear, linear, linear));
    all.add(new Operation(Operator.PLUS, linear, linear, linear));
    all.add(new Operation(Operator.TIMES, linear, RATIO, linear));
    all.add(new Operation(Operator.OVER, linear, RATIO, linear));
    if (linear != RATIO) {
      all.add(new Operation(Operator.TIMES, RATIO, linear, linear));
      all.add(new Operation(Operator.OVER, linear, linear, RATIO));
    }
  }
}
