package org.gasmargin.job;

import java.util.List;
import java.util.Map;
import org.gasmargin.units.Place;

/** A node of a YAML document with the place where it begins. */
sealed interface YamlNode {
  Place place();

  /** The word for messages, with its article. */
  String noun();

  /**
   * A single value.
   *
   * @param quoted whether it stood in quotes, so that {@code "null"} is a text
   */
  record Text(Place place, String value, boolean quoted) implements YamlNode {
    @Override
    public String noun() {
      return isMissing() ? "nothing" : Printable.quote(value);
    }

    /** Whether nothing was written, or YAML's word for nothing. */
    boolean isMissing() {
      return !quoted && (value.isEmpty() || value.matches("~|null|Null|NULL"));
    }
  }

  /**
   * Keys with values, in the order of the file.
   *
   * @param fields by key
   */
  record Table(Place place, Map<String, Field> fields) implements YamlNode {
    @Override
    public String noun() {
      return "a map of keys";
    }
  }

  /**
   * A list.
   *
   * @param items in order
   */
  record Series(Place place, List<YamlNode> items) implements YamlNode {
    @Override
    public String noun() {
      return "a list";
    }
  }

  /**
   * A value under a key.
   *
   * @param key where the key stands
   * @param value what it holds
   */
  record Field(Place key, YamlNode value) {}
}
