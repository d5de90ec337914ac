package org.gasmargin.vessel;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;

/** The wall materials that a job can name, from the project's own data file. */
public final class MaterialCatalogue {
  private static final String RESOURCE = "/materials/materials.yaml";

  private final Map<String, Material> materials;

  private MaterialCatalogue(Map<String, Material> materials) {
    this.materials = materials;
  }

  /** Reads the catalogue that comes with the program. */
  public static MaterialCatalogue load() {
    try (InputStream stream = MaterialCatalogue.class.getResourceAsStream(RESOURCE)) {
      if (stream == null) {
        throw new IllegalStateException(RESOURCE + " is missing");
      }
      Map<String, Material> materials = new TreeMap<>();
      Map<?, ?> file = map(new Load(LoadSettings.builder().build()).loadFromInputStream(stream));
      file.forEach((name, data) -> materials.put(text(name), material(text(name), map(data))));
      return new MaterialCatalogue(materials);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The material of that name. */
  public Optional<Material> find(String name) {
    return Optional.ofNullable(materials.get(name));
  }

  /** All names in alphabetical order. */
  public List<String> names() {
    return List.copyOf(materials.keySet());
  }

  private static Material material(String name, Map<?, ?> data) {
    List<Material.Point> points = new ArrayList<>();
    for (Object row : (List<?>) under(data, "points")) {
      Map<?, ?> point = map(row);
      points.add(
          new Material.Point(
              number(point, "temperature"),
              number(point, "conductivity"),
              number(point, "heat_capacity")));
    }
    String source = text(under(data, "source")) + " (" + text(under(data, "status")) + ")";
    return new Material(name, number(data, "density"), points, source);
  }

  private static Object under(Map<?, ?> data, String key) {
    Object value = data.get(key);
    if (value == null) {
      throw new IllegalStateException(RESOURCE + " lacks a " + key);
    }
    return value;
  }

  private static Map<?, ?> map(Object node) {
    return (Map<?, ?>) node;
  }

  private static String text(Object node) {
    return (String) node;
  }

  private static double number(Map<?, ?> data, String key) {
    return ((Number) under(data, key)).doubleValue();
  }
}
