package org.gasmargin.gas.equation;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * A plan that raises one base to many fixed exponents. Integers and eighths are built by
 * multiplication and square roots from smaller members of the plan; any other exponent costs one
 * exponential. Immutable; the values live in an array of the caller.
 */
final class PowerTable {
  private static final int ONE = 0;
  private static final int BASE = 1;
  private static final int RECIPROCAL = 2;
  private static final int SQUARE_ROOT = 3;
  private static final int EXPONENTIAL = 4;
  private static final int PRODUCT = 5;

  private record Step(int operation, int left, int right, double exponent) {}

  private final int[] operations;
  private final int[] lefts;
  private final int[] rights;
  private final double[] exponents;
  private final boolean needsLogarithm;
  private final Map<Double, Integer> slots = new HashMap<>();

  PowerTable(double... wanted) {
    List<Step> steps = new ArrayList<>();
    for (double exponent : wanted) {
      plan(exponent, steps);
    }
    operations = steps.stream().mapToInt(Step::operation).toArray();
    lefts = steps.stream().mapToInt(Step::left).toArray();
    rights = steps.stream().mapToInt(Step::right).toArray();
    exponents = steps.stream().mapToDouble(Step::exponent).toArray();
    needsLogarithm = steps.stream().anyMatch(step -> step.operation() == EXPONENTIAL);
  }

  private int plan(double exponent, List<Step> steps) {
    Integer known = slots.get(exponent);
    if (known != null) {
      return known;
    }
    Step step = step(exponent, steps);
    steps.add(step);
    slots.put(exponent, steps.size() - 1);
    return steps.size() - 1;
  }

  private Step step(double exponent, List<Step> steps) {
    double whole = Math.floor(exponent);
    double fraction = exponent - whole;
    if (exponent == 0) {
      return new Step(ONE, 0, 0, 0);
    }
    if (exponent == 1) {
      return new Step(BASE, 0, 0, 0);
    }
    if (exponent == -1) {
      return new Step(RECIPROCAL, 0, 0, 0);
    }
    if (exponent == 0.5 || exponent == 0.25 || exponent == 0.125) {
      return new Step(SQUARE_ROOT, plan(2 * exponent, steps), 0, 0);
    }
    if (8 * exponent != Math.rint(8 * exponent)) {
      return new Step(EXPONENTIAL, 0, 0, exponent);
    }
    double left;
    if (fraction == 0) {
      left = Math.rint(exponent / 2);
    } else if (whole != 0) {
      left = whole;
    } else {
      left = fraction > 0.5 ? 0.5 : 0.25;
    }
    int leftSlot = plan(left, steps);
    int rightSlot = plan(exponent - left, steps);
    return new Step(PRODUCT, leftSlot, rightSlot, 0);
  }

  int size() {
    return operations.length;
  }

  /** Where the power with this exponent stands in the array that {@link #fill} writes. */
  int slot(double exponent) {
    Integer slot = slots.get(exponent);
    if (slot == null) {
      throw new IllegalArgumentException("exponent " + exponent + " was not planned");
    }
    return slot;
  }

  /** Writes all planned powers of {@code base} (above zero) into {@code values}. */
  void fill(double base, double[] values) {
    double logarithm = needsLogarithm ? Math.log(base) : 0;
    for (int i = 0; i < operations.length; i++) {
      values[i] =
          switch (operations[i]) {
            case PRODUCT -> values[lefts[i]] * values[rights[i]];
            case EXPONENTIAL -> Math.exp(exponents[i] * logarithm);
            case SQUARE_ROOT -> Math.sqrt(values[lefts[i]]);
            case RECIPROCAL -> 1 / base;
            case BASE -> base;
            default -> 1;
          };
    }
  }
}
