package org.gasmargin.yaml;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.gasmargin.units.NearestName;

/** The fields of one map, checked for keys that nobody reads. */
public final class Fields {
  private final Value owner;
  private final Map<String, Value> values;
  private final Issues issues;

  private Fields(Value owner, Map<String, Value> values, Issues issues) {
    this.owner = owner;
    this.values = values;
    this.issues = issues;
  }

  /** The fields of a map that may hold these keys and no others; empty if it is not a map. */
  public static Optional<Fields> of(Value owner, Issues issues, String... keys) {
    Set<String> known = Set.of(keys);
    return named(owner, issues).map(fields -> fields.refuseOthersThan(known));
  }

  /** The fields of a map whose keys are names that the user chooses. */
  public static Optional<Fields> named(Value owner, Issues issues) {
    if (!(owner.node() instanceof YamlNode.Table table)) {
      issues.add(
          owner.place(),
          "a map of keys was expected "
              + (owner.path().isEmpty() ? "here" : "for " + owner.path())
              + ", not "
              + owner.node().noun());
      return Optional.empty();
    }
    Map<String, Value> values = new LinkedHashMap<>();
    table
        .fields()
        .forEach((key, field) -> values.put(key, owner.child(key, field.key(), field.value())));
    return Optional.of(new Fields(owner, values, issues));
  }

  /**
   * Reports keys that are not known. One that is nearly a known key that is missing is then read as
   * that key, so that the slip is reported once and its value is checked as well.
   */
  private Fields refuseOthersThan(Set<String> known) {
    List<String> missing = new ArrayList<>(known);
    missing.removeAll(values.keySet());
    for (Map.Entry<String, Value> entry : List.copyOf(values.entrySet())) {
      if (!known.contains(entry.getKey())) {
        Optional<String> meant = NearestName.of(entry.getKey(), missing);
        issues.add(
            entry.getValue().key(),
            "unknown key " + Printable.quote(entry.getKey()) + " " + owner.within(),
            meant
                .map(name -> "did you mean '" + name + "'?")
                .orElse("known here are " + String.join(", ", known.stream().sorted().toList())));
        meant.ifPresent(name -> values.putIfAbsent(name, entry.getValue()));
        meant.ifPresent(missing::remove);
      }
    }
    return this;
  }

  /** The map itself. */
  public Value owner() {
    return owner;
  }

  /** All fields by key, in the order of the file. */
  public Map<String, Value> all() {
    return values;
  }

  /** Whether a key stands here. */
  public boolean has(String key) {
    return values.containsKey(key);
  }

  /** The field of a key. */
  public Optional<Value> find(String key) {
    return Optional.ofNullable(values.get(key));
  }

  /** The field, or empty after an issue was added. */
  public Optional<Value> need(String key) {
    return need(key, "");
  }

  /**
   * The same with an example of what is missing.
   *
   * @param example a value for the key, or an empty text
   */
  public Optional<Value> need(String key, String example) {
    if (!has(key)) {
      issues.add(
          owner.key(),
          "missing key '" + key + "' " + owner.within(),
          example.isEmpty() ? "" : "write for example \"" + key + ": " + example + "\"");
    }
    return find(key);
  }

  /** Adds an issue if a key stands beside another with which it has no meaning. */
  public void refuse(String key, String beside) {
    find(key)
        .ifPresent(
            value ->
                issues.add(
                    value.key(),
                    key + " does not go with " + beside + " " + owner.within(),
                    "leave one of the two out"));
  }
}
