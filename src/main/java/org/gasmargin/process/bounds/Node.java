package org.gasmargin.process.bounds;

import org.gasmargin.gas.State;

/**
 * A state in which a step can be entered, and how the gas came there.
 *
 * @param state of the whole gas in the vessel
 * @param words the path so far, empty at the nominal start
 */
record Node(State state, String words) {

  /** The node reached by one more stretch of path; an empty stretch adds no words. */
  Node then(State next, String stretch) {
    return new Node(next, join(words, stretch));
  }

  /** Joins stretches of a path in words. */
  static String join(String path, String stretch) {
    if (path.isEmpty() || stretch.isEmpty()) {
      return path + stretch;
    }
    return path + ", then " + stretch;
  }
}
