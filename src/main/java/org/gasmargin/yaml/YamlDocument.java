package org.gasmargin.yaml;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;
import org.gasmargin.units.Place;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Parse;
import org.snakeyaml.engine.v2.common.ScalarStyle;
import org.snakeyaml.engine.v2.events.AliasEvent;
import org.snakeyaml.engine.v2.events.CollectionStartEvent;
import org.snakeyaml.engine.v2.events.DocumentStartEvent;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.events.MappingStartEvent;
import org.snakeyaml.engine.v2.events.NodeEvent;
import org.snakeyaml.engine.v2.events.ScalarEvent;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;

/**
 * Reads YAML 1.2 of unknown origin into nodes with places. It works on the parser's events, so that
 * nothing recurses, and stops at the first anchor, alias, tag, second document or excess of depth
 * or size: no file here needs any of them, and each can hide what a reviewer would want to see.
 */
public final class YamlDocument {
  /** Levels of nesting that are read. */
  public static final int DEEPEST = 20;

  /** Values that are read. */
  public static final int MOST_NODES = 20_000;

  private final String file;
  private final Issues issues;
  private final Deque<OpenNode> open = new ArrayDeque<>();
  private Optional<YamlNode> root = Optional.empty();
  private int nodes;
  private int documents;

  private YamlDocument(String file, Issues issues) {
    this.file = file;
    this.issues = issues;
  }

  /** The document, or empty after an issue was added. An empty file has no document. */
  public static Optional<YamlNode> read(String file, String text, Issues issues) {
    if (Printable.findsControl(file, text, issues)) {
      return Optional.empty();
    }
    YamlDocument document = new YamlDocument(file, issues);
    LoadSettings settings = LoadSettings.builder().setLabel("text").setUseMarks(true).build();
    try {
      for (Event event : new Parse(settings).parseString(text)) {
        if (!document.take(event)) {
          return Optional.empty();
        }
      }
    } catch (MarkedYamlEngineException e) {
      Place place = e.getProblemMark().map(document::place).orElse(new Place(file, 1, 1));
      issues.add(place, "this is not YAML: " + e.getProblem() + document.context(e));
      return Optional.empty();
    } catch (YamlEngineException e) {
      issues.add(new Place(file, 1, 1), "this is not YAML: " + e.getMessage());
      return Optional.empty();
    }
    return document.root;
  }

  private String context(MarkedYamlEngineException error) {
    return error
        .getContextMark()
        .map(this::place)
        .map(
            begin ->
                " "
                    + error.getContext()
                    + " from line "
                    + begin.line()
                    + ", column "
                    + begin.column())
        .orElse("");
  }

  /** Takes one event and tells whether to go on. */
  private boolean take(Event event) {
    Place place = event.getStartMark().map(this::place).orElse(new Place(file, 1, 1));
    if (event instanceof DocumentStartEvent && ++documents > 1) {
      return refuse(place, "a second document begins here", "a file holds one document");
    }
    if (event instanceof NodeEvent node && !isPlain(node, place)) {
      return false;
    }
    if (event instanceof ScalarEvent scalar) {
      boolean quoted = scalar.getScalarStyle() != ScalarStyle.PLAIN;
      add(new YamlNode.Text(place, scalar.getValue(), quoted, isVerbatim(scalar)));
    } else if (event instanceof CollectionStartEvent) {
      if (open.size() >= DEEPEST) {
        return refuse(place, "this is nested more than " + DEEPEST + " deep", "");
      }
      open.push(new OpenNode(place, event instanceof MappingStartEvent));
    } else if (event.getEventId() == Event.ID.MappingEnd
        || event.getEventId() == Event.ID.SequenceEnd) {
      add(open.pop().close());
    }
    return true;
  }

  /** An escape or a line break makes a text longer in the file than its value and its quotes. */
  private static boolean isVerbatim(ScalarEvent scalar) {
    if (scalar.getStartMark().isEmpty() || scalar.getEndMark().isEmpty()) {
      return false;
    }
    Mark start = scalar.getStartMark().get();
    Mark end = scalar.getEndMark().get();
    int quotes = scalar.isPlain() ? 0 : 2;
    int length = scalar.getValue().codePointCount(0, scalar.getValue().length()) + quotes;
    return start.getLine() == end.getLine() && end.getColumn() - start.getColumn() == length;
  }

  private boolean isPlain(NodeEvent node, Place place) {
    if (++nodes > MOST_NODES) {
      return refuse(place, "the file holds more than " + MOST_NODES + " values", "");
    }
    if (node instanceof AliasEvent || node.getAnchor().isPresent()) {
      return refuse(place, "anchors and aliases are not used here", "write the value out again");
    }
    Optional<String> tag =
        node instanceof ScalarEvent scalar
            ? scalar.getTag()
            : node instanceof CollectionStartEvent start ? start.getTag() : Optional.empty();
    if (tag.isPresent()) {
      return refuse(
          place,
          "the tag " + Printable.quote(tag.get()) + " is not allowed",
          "YAML tags are not used here");
    }
    return true;
  }

  private boolean refuse(Place place, String problem, String hint) {
    issues.add(place, problem, hint);
    return false;
  }

  private void add(YamlNode node) {
    if (open.isEmpty()) {
      root = Optional.of(node);
    } else {
      open.element().add(node, issues);
    }
  }

  private Place place(Mark mark) {
    return new Place(file, mark.getLine() + 1, mark.getColumn() + 1);
  }
}
