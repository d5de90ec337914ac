package org.gasmargin.yaml;

import java.util.List;
import java.util.Optional;
import org.gasmargin.units.Place;

/** A node of a YAML file with the place where it stands. */
public sealed interface YamlNode {

  /** Where the node begins. */
  Place place();

  /** What the node is, for messages: "a text", "a list", "a group of keys". */
  String kind();

  /**
   * A scalar. Its value is text; nothing is guessed from its look.
   *
   * @param place where it begins, at the quote if there is one
   * @param value the text without quotes
   * @param textColumn column of the first character of the value if the value stands in the file
   *     letter by letter; 0 if quotes, escapes or line breaks make them differ
   */
  record Scalar(Place place, String value, int textColumn) implements YamlNode {
    @Override
    public String kind() {
      return "a text";
    }

    /**
     * Where a character of the value stands in the file; the start of the scalar if that cannot be
     * told.
     *
     * @param offset counted from 0, in code points
     */
    public Place placeOf(int offset) {
      return textColumn == 0 ? place : new Place(place.file(), place.line(), textColumn + offset);
    }
  }

  /** A list. */
  record Sequence(Place place, List<YamlNode> items) implements YamlNode {
    /** Copies the list. */
    public Sequence {
      items = List.copyOf(items);
    }

    @Override
    public String kind() {
      return "a list";
    }
  }

  /** Keys with values, in the order of the file; no key stands twice. */
  record Mapping(Place place, List<Entry> entries) implements YamlNode {
    /** Copies the list. */
    public Mapping {
      entries = List.copyOf(entries);
    }

    @Override
    public String kind() {
      return "a group of keys";
    }

    /** The value of a key. */
    public Optional<YamlNode> get(String key) {
      return entries.stream()
          .filter(entry -> entry.key().value().equals(key))
          .map(Entry::value)
          .findFirst();
    }
  }

  /**
   * A key with its value.
   *
   * @param key the key as written
   * @param value its value
   */
  record Entry(Scalar key, YamlNode value) {}
}
