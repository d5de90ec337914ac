package org.gasmargin.job;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.gasmargin.units.Entry;
import org.gasmargin.units.NearestName;
import org.gasmargin.units.Place;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Lists;
import org.gasmargin.yaml.Printable;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;

/**
 * The user's answers to the reader's questions: paths of values that are unusual and meant. A
 * confirmation of something that is not in question is refused, so that none is left behind to
 * silence a later slip.
 */
final class Confirmations {
  static final int MOST = 100;

  private final Map<String, Place> given = new LinkedHashMap<>();
  private final List<Entry> entries = new ArrayList<>();
  private final Set<String> asked = new LinkedHashSet<>();
  private final Issues issues;

  Confirmations(Issues issues) {
    this.issues = issues;
  }

  /** Reads the list of paths. */
  void read(Value list) {
    for (Value item : Lists.items(list, 0, MOST, issues)) {
      Optional<String> path = Texts.word(item, issues);
      if (path.isPresent()) {
        given.putIfAbsent(path.get(), item.place());
        entries.add(new Entry(item.path(), path.get(), Optional.empty(), item.place()));
      }
    }
  }

  /** What the user confirmed, for the list of inputs that a reviewer sees. */
  List<Entry> entries() {
    return entries;
  }

  /** Adds the question as an issue unless the user has answered it. */
  void ask(String path, Place place, String question) {
    asked.add(path);
    if (!given.containsKey(path)) {
      issues.add(place, question, "if it is meant, add " + path + " to the list 'confirmed'");
    }
  }

  /** Refuses the answers to which there was no question. */
  void refuseUnasked() {
    given.forEach(
        (path, place) -> {
          if (!asked.contains(path)) {
            Optional<String> near = NearestName.of(path, asked);
            issues.add(
                place,
                "nothing is in question at " + Printable.quote(path),
                near.map(name -> "did you mean " + name + "?")
                    .orElse("take it out of 'confirmed'"));
          }
        });
  }
}
