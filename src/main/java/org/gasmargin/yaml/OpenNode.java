package org.gasmargin.yaml;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.units.Place;

/** A map or list of which the end is not yet read. */
final class OpenNode {
  private final Place place;
  private final boolean isTable;
  private final Map<String, YamlNode.Field> fields = new LinkedHashMap<>();
  private final List<YamlNode> items = new ArrayList<>();
  private Optional<YamlNode> key = Optional.empty();

  OpenNode(Place place, boolean isTable) {
    this.place = place;
    this.isTable = isTable;
  }

  /** Adds an item, a key or the value of the last key. */
  void add(YamlNode node, Issues issues) {
    if (!isTable) {
      items.add(node);
    } else if (key.isEmpty()) {
      key = Optional.of(node);
    } else {
      put(key.get(), node, issues);
      key = Optional.empty();
    }
  }

  private void put(YamlNode keyNode, YamlNode value, Issues issues) {
    if (!(keyNode instanceof YamlNode.Text text)) {
      issues.add(keyNode.place(), "a key must be a single word, not " + keyNode.noun());
      return;
    }
    YamlNode.Field first =
        fields.putIfAbsent(text.value(), new YamlNode.Field(text.place(), value));
    if (first != null) {
      issues.add(
          text.place(),
          "the key "
              + Printable.quote(text.value())
              + " stands here a second time, first at line "
              + first.key().line()
              + ", column "
              + first.key().column(),
          "keep one of the two");
    }
  }

  YamlNode close() {
    return isTable ? new YamlNode.Table(place, fields) : new YamlNode.Series(place, items);
  }
}
