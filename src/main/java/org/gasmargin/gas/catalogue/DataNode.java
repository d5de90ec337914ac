package org.gasmargin.gas.catalogue;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.gasmargin.gas.equation.PowerSum;

/**
 * A mapping in a gas data file, with its place for messages. A fault in these files is a fault of
 * the program, found by the tests that load every file.
 */
final class DataNode {
  private final String place;
  private final Map<?, ?> entries;

  private DataNode(String place, Map<?, ?> entries) {
    this.place = place;
    this.entries = entries;
  }

  static DataNode of(String place, Object value) {
    if (value instanceof Map<?, ?> map) {
      return new DataNode(place, map);
    }
    throw new IllegalStateException(place + ": a mapping was expected");
  }

  private Object get(String key) {
    Object value = entries.get(key);
    if (value == null) {
      throw new IllegalStateException(place + ": '" + key + "' is missing");
    }
    return value;
  }

  boolean has(String key) {
    return entries.get(key) != null;
  }

  String text(String key) {
    if (get(key) instanceof String text) {
      return text;
    }
    throw new IllegalStateException(place + "." + key + ": text was expected");
  }

  double number(String key) {
    return toNumber(place + "." + key, get(key));
  }

  DataNode node(String key) {
    return of(place + "." + key, get(key));
  }

  List<DataNode> nodes(String key) {
    return list(key).stream().map(value -> of(place + "." + key, value)).toList();
  }

  List<String> texts(String key) {
    return list(key).stream().map(String::valueOf).toList();
  }

  /** One row of numbers. */
  List<Double> row(String key, int count) {
    double[] row = toRow(place + "." + key, get(key));
    if (row.length != count) {
      throw new IllegalStateException(place + "." + key + ": " + count + " numbers were expected");
    }
    return Arrays.stream(row).boxed().toList();
  }

  /** A sum of powers from rows of numbers, each with the same count. */
  PowerSum powers(String key, int columns) {
    return new PowerSum(rows(key, columns));
  }

  /** Rows of numbers, each with the same count. */
  double[][] rows(String key, int columns) {
    double[][] rows =
        list(key).stream().map(row -> toRow(place + "." + key, row)).toArray(double[][]::new);
    for (double[] row : rows) {
      if (row.length != columns) {
        throw new IllegalStateException(
            place + "." + key + ": rows of " + columns + " numbers were expected");
      }
    }
    return rows;
  }

  IllegalStateException unknown(String key) {
    return new IllegalStateException(place + "." + key + ": unknown '" + get(key) + "'");
  }

  private List<?> list(String key) {
    if (get(key) instanceof List<?> list) {
      return list;
    }
    throw new IllegalStateException(place + "." + key + ": a list was expected");
  }

  private static double[] toRow(String place, Object value) {
    if (value instanceof List<?> list) {
      return list.stream().mapToDouble(item -> toNumber(place, item)).toArray();
    }
    throw new IllegalStateException(place + ": a row of numbers was expected");
  }

  private static double toNumber(String place, Object value) {
    if (value instanceof Number number && Double.isFinite(number.doubleValue())) {
      return number.doubleValue();
    }
    throw new IllegalStateException(place + ": a finite number was expected");
  }
}
