package org.gasmargin.job;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Entry;
import org.gasmargin.units.Interval;
import org.gasmargin.units.Quantity;
import org.gasmargin.units.QuantityError;
import org.gasmargin.units.QuantityParser;
import org.gasmargin.units.Unit;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.PlaceOrder;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;
import org.gasmargin.yaml.YamlNode;

/** Reads quantities, keeps what was typed, and asks about values that look like a slip. */
final class Quantities {
  private final Issues issues;
  private final Confirmations confirmations;
  private final Interval atmosphere;
  private final List<Read> read = new ArrayList<>();

  /**
   * @param atmosphere atmospheric pressure, Pa absolute
   */
  Quantities(Issues issues, Confirmations confirmations, Interval atmosphere) {
    this.issues = issues;
    this.confirmations = confirmations;
    this.atmosphere = atmosphere;
  }

  /**
   * A quantity with where the user read it.
   *
   * @param quantity in SI and as typed
   * @param readFrom nameplate, data sheet and the like
   */
  record Sourced(Quantity quantity, Optional<String> readFrom) {}

  private record Read(Entry entry, Quantity quantity) {}

  /** The same readers' notes with the atmosphere that the job has stated. */
  Quantities under(Interval stated) {
    Quantities next = new Quantities(issues, confirmations, stated);
    next.read.addAll(read);
    return next;
  }

  Issues issues() {
    return issues;
  }

  Confirmations confirmations() {
    return confirmations;
  }

  /** Nominal atmospheric pressure, Pa absolute. */
  double atmosphere() {
    return atmosphere.nominal();
  }

  /** A quantity, bare or as {@code {value: ..., read_from: ...}}. */
  Optional<Quantity> quantity(Value value, InputKind kind) {
    if (value.node() instanceof YamlNode.Table) {
      return Fields.of(value, issues, "value", "read_from")
          .flatMap(fields -> sourced(fields, kind))
          .map(Sourced::quantity);
    }
    return plain(value, value.path(), Optional.empty(), kind);
  }

  /** The number of a quantity that has no tolerance, SI. */
  Optional<Double> number(Fields fields, String key, InputKind kind) {
    return needed(fields, key, kind).map(quantity -> quantity.si().nominal());
  }

  /** The quantity under a key that must be there. */
  Optional<Quantity> needed(Fields fields, String key, InputKind kind) {
    return fields.need(key, kind.dimension().example()).flatMap(value -> quantity(value, kind));
  }

  /** A quantity that is given as a map, {@code value} with the place where it was read. */
  Optional<Sourced> sourced(Fields fields, InputKind kind) {
    Optional<String> readFrom = fields.find("read_from").flatMap(text -> Texts.word(text, issues));
    return fields
        .need("value", kind.dimension().example())
        .flatMap(value -> plain(value, fields.owner().path(), readFrom, kind))
        .map(quantity -> new Sourced(quantity, readFrom));
  }

  private Optional<Quantity> plain(
      Value value, String path, Optional<String> readFrom, InputKind kind) {
    if (!(value.node() instanceof YamlNode.Text text) || text.isMissing()) {
      issues.add(
          value.place(),
          kind.dimension().noun() + " was expected for " + path + ", not " + value.node().noun(),
          "write for example \"" + kind.dimension().example() + "\"");
      return Optional.empty();
    }
    Interval zeroOfGauges =
        kind.isFixedToVessel() ? Interval.exactly(atmosphere.nominal()) : atmosphere;
    try {
      Quantity quantity = new QuantityParser(zeroOfGauges).parse(text.value(), kind.dimension());
      read.add(new Read(new Entry(path, quantity.typed(), readFrom, value.place()), quantity));
      Soundness soundness = new Soundness(issues, confirmations);
      return soundness.holds(quantity, kind, path, value.place())
          ? Optional.of(quantity)
          : Optional.empty();
    } catch (QuantityError e) {
      issues.add(value.place(), e.problem(), e.hint().orElse(""));
      return Optional.empty();
    }
  }

  /** All quantities and confirmations as typed, in the order of the file. */
  List<Entry> entries() {
    return Stream.concat(read.stream().map(Read::entry), confirmations.entries().stream())
        .sorted(Comparator.comparing(Entry::place, PlaceOrder.IN_FILE))
        .toList();
  }

  /**
   * The units that the user typed first, pressure from the vessels rather than from the barometer.
   */
  DisplayUnits displayUnits() {
    Map<Dimension, Unit> units = new EnumMap<>(Dimension.class);
    List<Read> ordered =
        read.stream()
            .sorted(Comparator.comparing(one -> one.entry().place(), PlaceOrder.IN_FILE))
            .toList();
    for (boolean atSite : new boolean[] {false, true}) {
      for (Read one : ordered) {
        if (one.entry().path().startsWith("site.") == atSite) {
          units.putIfAbsent(one.quantity().unit().dimension(), one.quantity().unit());
        }
      }
    }
    return new DisplayUnits(units, atmosphere.nominal());
  }
}
