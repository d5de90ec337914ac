package org.gasmargin.yaml;

import org.gasmargin.units.Place;

/**
 * A node with its path in the file.
 *
 * @param path for example {@code vessels.receiver.volume}; empty for the whole file
 * @param key where its key stands
 * @param node the node itself
 */
public record Value(String path, Place key, YamlNode node) {

  /** Where the node begins. */
  public Place place() {
    return node.place();
  }

  /** A node below this one. */
  public Value child(String name, Place place, YamlNode child) {
    return new Value(path.isEmpty() ? name : path + "." + name, place, child);
  }

  /** The path as the place in a sentence, for example {@code in supplies.bank}. */
  public String within() {
    return path.isEmpty() ? "at the top of the file" : "in " + path;
  }
}
