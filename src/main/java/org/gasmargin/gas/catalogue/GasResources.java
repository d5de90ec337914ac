package org.gasmargin.gas.catalogue;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;

/** The data files of the gases, as they lie in the program. */
final class GasResources {
  private static final String FOLDER = "/gases/";

  private GasResources() {}

  /** The index, in the order in which gases are listed. */
  static List<GasSummary> index() {
    if (!(load("index") instanceof List<?> list)) {
      throw new IllegalStateException("gases/index.yaml: a list was expected");
    }
    return list.stream()
        .map(entry -> DataNode.of("gases/index.yaml", entry))
        .map(
            node ->
                new GasSummary(
                    node.text("id"),
                    node.text("name"),
                    node.text("formula"),
                    node.texts("synonyms")))
        .toList();
  }

  /** The data of one gas. */
  static DataNode gas(String id) {
    return DataNode.of("gases/" + id + ".yaml", load(id));
  }

  private static Object load(String name) {
    String path = FOLDER + name + ".yaml";
    try (InputStream stream = GasResources.class.getResourceAsStream(path)) {
      if (stream == null) {
        throw new IllegalStateException("resource " + path + " is missing");
      }
      Object value =
          new Load(LoadSettings.builder().setLabel(path).build()).loadFromInputStream(stream);
      if (value == null) {
        throw new IllegalStateException("resource " + path + " is empty");
      }
      return value;
    } catch (IOException e) {
      throw new UncheckedIOException("resource " + path, e);
    }
  }
}
