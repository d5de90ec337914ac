package org.gasmargin.job;

import org.gasmargin.units.Place;

/**
 * A node with its path in the job.
 *
 * @param path for example {@code vessels.receiver.volume}; empty for the whole file
 * @param key where its key stands
 * @param node the node itself
 */
record Value(String path, Place key, YamlNode node) {

  Place place() {
    return node.place();
  }

  Value child(String name, Place place, YamlNode child) {
    return new Value(path.isEmpty() ? name : path + "." + name, place, child);
  }

  /** The path as the place in a sentence, for example {@code in supplies.bank}. */
  String within() {
    return path.isEmpty() ? "at the top of the file" : "in " + path;
  }
}
