package org.gasmargin.job;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.jspecify.annotations.Nullable;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.schema.CoreSchema;

/**
 * Spoils the tree of a job at one random node: a key gone, renamed or moved, a value of another
 * kind.
 */
final class TreeSpoiler {
  private static final List<String> KEYS =
      List.of(
          "volume",
          "until",
          "within",
          "for",
          "mass_flow",
          "through",
          "from",
          "wind",
          "plate",
          "sphere",
          "material",
          "density",
          "read_from",
          "value",
          "margin",
          "fill",
          "hold",
          "colour");

  private final Random random;
  private int countdown;

  TreeSpoiler(Random random) {
    this.random = random;
  }

  Object spoil(String text) {
    Object tree =
        new Load(LoadSettings.builder().setSchema(new CoreSchema()).build()).loadFromString(text);
    countdown = random.nextInt(size(tree));
    return copy(tree);
  }

  private static int size(@Nullable Object node) {
    int size = 1;
    if (node instanceof Map<?, ?> map) {
      for (Object value : map.values()) {
        size += size(value);
      }
    } else if (node instanceof List<?> list) {
      for (Object value : list) {
        size += size(value);
      }
    }
    return size;
  }

  private Object copy(Object node) {
    if (countdown-- == 0) {
      return spoiled(node);
    }
    if (node instanceof Map<?, ?> map) {
      Map<Object, Object> copy = new LinkedHashMap<>();
      map.forEach((key, value) -> copy.put(key, copy(value)));
      return copy;
    }
    if (node instanceof List<?> list) {
      List<Object> copy = new ArrayList<>();
      list.forEach(value -> copy.add(copy(value)));
      return copy;
    }
    return node;
  }

  private Object spoiled(Object node) {
    if (node instanceof Map<?, ?> map && !map.isEmpty() && random.nextInt(4) > 0) {
      return spoiledMap(map);
    }
    if (node instanceof List<?> list && random.nextInt(3) > 0) {
      List<Object> copy = new ArrayList<>(list);
      copy.add(list.isEmpty() || random.nextBoolean() ? "more" : list.get(0));
      return random.nextBoolean() ? copy : List.of();
    }
    return switch (random.nextInt(9)) {
      case 0 -> 7;
      case 1 -> 0.5;
      case 2 -> true;
      case 3 -> "";
      case 4 -> "some words";
      case 5 -> "200 bar";
      case 6 -> List.of(node);
      case 7 -> Map.of("value", node);
      default -> Map.of();
    };
  }

  private Object spoiledMap(Map<?, ?> map) {
    Map<Object, Object> copy = new LinkedHashMap<>(map);
    Object key = new ArrayList<>(copy.keySet()).get(random.nextInt(copy.size()));
    String other = KEYS.get(random.nextInt(KEYS.size()));
    switch (random.nextInt(3)) {
      case 0 -> copy.remove(key);
      case 1 -> copy.put(other, "3 bar(g)");
      default -> copy.put(other, copy.remove(key));
    }
    return copy;
  }
}
