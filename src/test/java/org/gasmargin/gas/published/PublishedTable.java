package org.gasmargin.gas.published;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/** Rows of a comma-separated table in the folder of published data; lines with # are comments. */
public final class PublishedTable {
  /** One row, by column name; empty cells are absent. */
  public record Row(Map<String, String> cells) {
    public String text(String column) {
      String cell = cells.get(column);
      if (cell == null) {
        throw new IllegalArgumentException("no " + column + " in " + cells);
      }
      return cell;
    }

    public double number(String column) {
      return Double.parseDouble(text(column));
    }

    public boolean has(String column) {
      return cells.containsKey(column);
    }

    @Override
    public String toString() {
      return cells.toString();
    }
  }

  private PublishedTable() {}

  public static Stream<Row> rows(String name) {
    String path = "/published/" + name + ".csv";
    List<String> lines = new ArrayList<>();
    try (InputStream stream = PublishedTable.class.getResourceAsStream(path)) {
      if (stream == null) {
        throw new IllegalArgumentException("missing " + path);
      }
      new String(stream.readAllBytes(), StandardCharsets.UTF_8)
          .lines()
          .filter(line -> !line.isBlank() && !line.startsWith("#"))
          .forEach(lines::add);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    List<String> header = List.of(lines.get(0).split(",", -1));
    return lines.stream().skip(1).map(line -> row(header, line.split(",", -1)));
  }

  private static Row row(List<String> header, String[] values) {
    if (values.length != header.size()) {
      throw new IllegalArgumentException("row of " + values.length + " cells under " + header);
    }
    Map<String, String> cells = new HashMap<>();
    for (int i = 0; i < values.length; i++) {
      if (!values[i].isBlank()) {
        cells.put(header.get(i), values[i]);
      }
    }
    return new Row(cells);
  }
}
