package org.gasmargin.yaml;

import java.util.ArrayList;
import java.util.List;

/** Reads lists. */
public final class Lists {
  private Lists() {}

  /**
   * The items, numbered from 1 in their paths; none, after an issue, if it is not a list or has too
   * few or too many.
   */
  public static List<Value> items(Value list, int least, int most, Issues issues) {
    if (!(list.node() instanceof YamlNode.Series series)) {
      issues.add(
          list.place(), "a list was expected for " + list.path() + ", not " + list.node().noun());
      return List.of();
    }
    int size = series.items().size();
    if (size < least || size > most) {
      issues.add(
          list.key(),
          list.path() + " holds " + size + " items, " + least + " to " + most + " were expected");
      return List.of();
    }
    List<Value> items = new ArrayList<>();
    for (YamlNode node : series.items()) {
      items.add(list.child(String.valueOf(items.size() + 1), node.place(), node));
    }
    return items;
  }
}
