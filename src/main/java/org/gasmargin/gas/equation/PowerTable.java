package org.gasmargin.gas.equation;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;

/**
 * A plan that raises one base to many fixed exponents. Integers and eighths are built by
 * multiplication and square roots from smaller members of the plan; any other exponent costs one
 * exponential. Immutable; the values live in an array of the caller.
 */
final class PowerTable {
  private enum Operation {
    ONE,
    BASE,
    RECIPROCAL,
    SQUARE_ROOT,
    EXPONENTIAL,
    PRODUCT
  }

  private record Step(Operation operation, double exponent, double left, double right) {
    static Step leaf(Operation operation, double exponent) {
      return new Step(operation, exponent, Double.NaN, Double.NaN);
    }
  }

  // leaves come first, products after them, each behind what it needs
  private final Operation[] leaves;
  private final double[] exponents;
  private final int[] sources;
  private final int[] lefts;
  private final int[] rights;
  private final boolean needsLogarithm;
  private final Map<Double, Integer> slots;

  PowerTable(double... wanted) {
    Map<Double, Step> plan = new LinkedHashMap<>();
    for (double exponent : wanted) {
      plan(exponent, plan);
    }
    List<Step> leafSteps = steps(plan, step -> step.operation() != Operation.PRODUCT);
    List<Step> products = steps(plan, step -> step.operation() == Operation.PRODUCT);
    slots = new HashMap<>();
    leafSteps.forEach(step -> slots.put(step.exponent(), slots.size()));
    products.forEach(step -> slots.put(step.exponent(), slots.size()));
    leaves = leafSteps.stream().map(Step::operation).toArray(Operation[]::new);
    exponents = leafSteps.stream().mapToDouble(Step::exponent).toArray();
    sources =
        leafSteps.stream()
            .mapToInt(
                step -> step.operation() == Operation.SQUARE_ROOT ? slot(2 * step.exponent()) : 0)
            .toArray();
    lefts = products.stream().mapToInt(step -> slot(step.left())).toArray();
    rights = products.stream().mapToInt(step -> slot(step.right())).toArray();
    needsLogarithm = leafSteps.stream().anyMatch(s -> s.operation() == Operation.EXPONENTIAL);
  }

  private static List<Step> steps(Map<Double, Step> plan, Predicate<Step> which) {
    return plan.values().stream().filter(which).toList();
  }

  /** Puts the exponent into the plan, behind all that it is built from. */
  private static void plan(double exponent, Map<Double, Step> plan) {
    if (plan.containsKey(exponent)) {
      return;
    }
    Step step = step(exponent);
    if (step.operation() == Operation.SQUARE_ROOT) {
      plan(2 * exponent, plan);
    } else if (step.operation() == Operation.PRODUCT) {
      plan(step.left(), plan);
      plan(step.right(), plan);
    }
    plan.put(exponent, step);
  }

  private static Step step(double exponent) {
    if (exponent == 0) {
      return Step.leaf(Operation.ONE, exponent);
    }
    if (exponent == 1) {
      return Step.leaf(Operation.BASE, exponent);
    }
    if (exponent == -1) {
      return Step.leaf(Operation.RECIPROCAL, exponent);
    }
    if (exponent == 0.5 || exponent == 0.25 || exponent == 0.125) {
      return Step.leaf(Operation.SQUARE_ROOT, exponent);
    }
    if (8 * exponent != Math.rint(8 * exponent)) {
      return Step.leaf(Operation.EXPONENTIAL, exponent);
    }
    double whole = Math.floor(exponent);
    double left;
    if (exponent == whole) {
      left = Math.rint(exponent / 2);
    } else if (whole != 0) {
      left = whole;
    } else {
      left = exponent > 0.5 ? 0.5 : 0.25;
    }
    return new Step(Operation.PRODUCT, exponent, left, exponent - left);
  }

  int size() {
    return leaves.length + lefts.length;
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
    for (int i = 0; i < leaves.length; i++) {
      values[i] =
          switch (leaves[i]) {
            case ONE -> 1;
            case BASE -> base;
            case RECIPROCAL -> 1 / base;
            case SQUARE_ROOT -> Math.sqrt(values[sources[i]]);
            default -> Math.exp(exponents[i] * logarithm);
          };
    }
    int product = leaves.length;
    for (int i = 0; i < lefts.length; i++) {
      values[product++] = values[lefts[i]] * values[rights[i]];
    }
  }
}
