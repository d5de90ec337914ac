package org.gasmargin.yaml;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.units.Place;
import org.gasmargin.yaml.YamlNode.Entry;
import org.gasmargin.yaml.YamlNode.Mapping;
import org.gasmargin.yaml.YamlNode.Scalar;
import org.gasmargin.yaml.YamlNode.Sequence;
import org.jspecify.annotations.Nullable;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Parse;
import org.snakeyaml.engine.v2.events.AliasEvent;
import org.snakeyaml.engine.v2.events.CollectionStartEvent;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.events.NodeEvent;
import org.snakeyaml.engine.v2.events.ScalarEvent;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;

/**
 * Reads one YAML document into nodes with places. The tree grows from the events of the parser
 * without recursion; size, depth and number of nodes are bounded, and tags, anchors, aliases,
 * repeated keys and a second document are refused.
 */
public final class YamlReader {
  private static final int LARGEST_TEXT = 1_000_000;
  private static final int DEEPEST = 32;
  private static final int MOST_NODES = 50_000;

  private final String file;
  private final int[] text;
  private final Deque<Open> open = new ArrayDeque<>();
  private @Nullable YamlNode root;
  private int nodes;

  private YamlReader(String file, int[] text) {
    this.file = file;
    this.text = text;
  }

  /**
   * Reads a text.
   *
   * @param file name for messages
   * @param text whole file
   * @return the root, or empty for a file without content
   */
  public static Optional<YamlNode> read(String file, String text) throws YamlRefused {
    if (text.length() > LARGEST_TEXT) {
      throw new YamlRefused(
          new TextIssue(
              new Place(file, 1, 1),
              "the file is larger than " + LARGEST_TEXT + " characters; split it"));
    }
    return new YamlReader(file, text.codePoints().toArray()).readAll(text);
  }

  private Optional<YamlNode> readAll(String whole) throws YamlRefused {
    try {
      for (Event event :
          new Parse(LoadSettings.builder().setLabel(file).build()).parseString(whole)) {
        take(event);
      }
    } catch (MarkedYamlEngineException e) {
      throw refusal(e.getProblemMark(), "cannot be read as YAML: " + firstLine(e.getProblem()));
    } catch (YamlEngineException e) {
      throw refusal(Optional.empty(), "cannot be read as YAML: " + firstLine(e.getMessage()));
    }
    return Optional.ofNullable(root);
  }

  private void take(Event event) throws YamlRefused {
    switch (event.getEventId()) {
      case Scalar, Alias, SequenceStart, MappingStart -> takeNode((NodeEvent) event);
      case SequenceEnd, MappingEnd -> add(open.pop().close(), event);
      default -> {}
    }
  }

  private void takeNode(NodeEvent event) throws YamlRefused {
    if (event instanceof AliasEvent || event.getAnchor().isPresent()) {
      throw refusal(event.getStartMark(), "anchors and aliases are not accepted; write it out");
    }
    if (root != null) {
      throw refusal(event.getStartMark(), "a second document is not accepted; use one file each");
    }
    if (++nodes > MOST_NODES) {
      throw refusal(event.getStartMark(), "the file holds more than " + MOST_NODES + " values");
    }
    if (event instanceof ScalarEvent scalar) {
      refuseTag(scalar.getTag(), event);
      add(scalar(scalar), event);
    } else if (event instanceof CollectionStartEvent start) {
      refuseTag(start.getTag(), event);
      if (open.size() >= DEEPEST) {
        throw refusal(event.getStartMark(), "nested deeper than " + DEEPEST + " levels");
      }
      open.push(new Open(place(event.getStartMark()), start.getEventId() == Event.ID.MappingStart));
    }
  }

  private void refuseTag(Optional<String> tag, Event event) throws YamlRefused {
    if (tag.isPresent()) {
      throw refusal(
          event.getStartMark(),
          "the tag '" + tag.get() + "' is not accepted; put a text that begins with ! in quotes");
    }
  }

  private void add(YamlNode node, Event event) throws YamlRefused {
    Open parent = open.peek();
    if (parent == null) {
      root = node;
      return;
    }
    Optional<String> problem = parent.add(node);
    if (problem.isPresent()) {
      throw refusal(event.getStartMark(), problem.get());
    }
  }

  private Scalar scalar(ScalarEvent event) {
    Place place = place(event.getStartMark());
    return new Scalar(place, event.getValue(), textColumn(event, place));
  }

  private int textColumn(ScalarEvent event, Place place) {
    int skip = event.isPlain() ? 0 : 1;
    int start = event.getStartMark().map(Mark::getIndex).orElse(text.length) + skip;
    int[] value = event.getValue().codePoints().toArray();
    if (event.isLiteral() || event.isFolded() || start + value.length > text.length) {
      return 0;
    }
    for (int i = 0; i < value.length; i++) {
      if (text[start + i] != value[i]) {
        return 0;
      }
    }
    return place.column() + skip;
  }

  private Place place(Optional<Mark> mark) {
    return mark.map(m -> new Place(file, m.getLine() + 1, m.getColumn() + 1))
        .orElseGet(() -> new Place(file, 1, 1));
  }

  private YamlRefused refusal(Optional<Mark> mark, String problem) {
    return new YamlRefused(new TextIssue(place(mark), problem));
  }

  private static String firstLine(@Nullable String message) {
    return message == null ? "unknown fault" : message.lines().findFirst().orElse("unknown fault");
  }

  /** A collection whose end has not been seen yet. */
  private static final class Open {
    private final Place place;
    private final boolean mapping;
    private final List<YamlNode> items = new ArrayList<>();
    private final List<Entry> entries = new ArrayList<>();
    private final Map<String, Place> keys = new HashMap<>();
    private @Nullable Scalar key;

    Open(Place place, boolean mapping) {
      this.place = place;
      this.mapping = mapping;
    }

    /** Takes the next item, key or value; gives the problem if it is not acceptable. */
    Optional<String> add(YamlNode node) {
      if (!mapping) {
        items.add(node);
      } else if (key != null) {
        entries.add(new Entry(key, node));
        key = null;
      } else if (node instanceof Scalar scalar) {
        key = scalar;
        Place first = keys.putIfAbsent(scalar.value(), scalar.place());
        return Optional.ofNullable(first)
            .map(
                p ->
                    "the key '"
                        + scalar.value()
                        + "' stands already in line "
                        + p.line()
                        + ", column "
                        + p.column());
      } else {
        return Optional.of("a key must be a word, not " + node.kind());
      }
      return Optional.empty();
    }

    YamlNode close() {
      return mapping ? new Mapping(place, entries) : new Sequence(place, items);
    }
  }
}
