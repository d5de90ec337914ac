package org.gasmargin.yaml;

import java.util.List;
import java.util.Map;
import org.gasmargin.units.Place;

/** A node of a YAML document with the place where it begins. */
public sealed interface YamlNode {
  /** Where the node begins. */
  Place place();

  /** The word for messages, with its article. */
  String noun();

  /**
   * A single value.
   *
   * @param quoted whether it stood in quotes, so that {@code "null"} is a text
   * @param verbatim whether the value stands in the file letter by letter, without escapes and line
   *     breaks
   */
  record Text(Place place, String value, boolean quoted, boolean verbatim) implements YamlNode {
    @Override
    public String noun() {
      return isMissing() ? "nothing" : Printable.quote(value);
    }

    /** Whether nothing was written, or YAML's word for nothing. */
    public boolean isMissing() {
      return !quoted && (value.isEmpty() || value.matches("~|null|Null|NULL"));
    }

    /**
     * Where a letter of the value stands in the file; the start of the text if that cannot be told.
     *
     * @param offset counted from 0, in code points
     */
    public Place placeOf(int offset) {
      int first = place.column() + (quoted ? 1 : 0);
      return verbatim ? new Place(place.file(), place.line(), first + offset) : place;
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
