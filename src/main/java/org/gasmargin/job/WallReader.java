package org.gasmargin.job;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Lists;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;
import org.gasmargin.yaml.YamlNode;

/** Reads {@code wall}: one shape, the layers from the inside, and the two films. */
final class WallReader {
  static final int MOST_LAYERS = 12;

  private static final String CORRELATION = "correlation";
  private static final Map<String, OutsideFilm> OUTSIDE_WORDS =
      Map.of(
          "still_air", new OutsideFilm.StillAir(),
          "water_bath", new OutsideFilm.WaterBath(),
          "insulated", new OutsideFilm.Insulated());

  private final LayerReader layers;
  private final Quantities quantities;
  private final Issues issues;

  WallReader(LayerReader layers, Quantities quantities) {
    this.layers = layers;
    this.quantities = quantities;
    issues = quantities.issues();
  }

  /** The wall, or empty after an issue was added. */
  Optional<Wall> read(Value value) {
    return Fields.of(value, issues, "cylinder", "sphere", "plate", "layers", "inside", "outside")
        .flatMap(this::wall);
  }

  private Optional<Wall> wall(Fields fields) {
    Optional<WallShape> shape = shape(fields);
    Optional<List<Layer>> layerList = fields.need("layers").flatMap(this::layers);
    Optional<InsideFilm> inside =
        fields.has("inside")
            ? fields.find("inside").flatMap(this::inside)
            : Optional.of(new InsideFilm.Correlation());
    Optional<OutsideFilm> outside =
        fields.has("outside")
            ? fields.find("outside").flatMap(this::outside)
            : Optional.of(new OutsideFilm.StillAir());
    if (shape.isEmpty() || layerList.isEmpty() || inside.isEmpty() || outside.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(new Wall(shape.get(), layerList.get(), inside.get(), outside.get()));
  }

  private Optional<WallShape> shape(Fields fields) {
    List<String> given =
        List.of("cylinder", "sphere", "plate").stream().filter(fields::has).toList();
    if (given.size() != 1) {
      issues.add(
          fields.owner().key(),
          given.isEmpty()
              ? fields.owner().path() + " has no shape"
              : fields.owner().path() + " has more than one shape: " + String.join(", ", given),
          "give one of cylinder, sphere, plate");
      return Optional.empty();
    }
    Value value = fields.find(given.get(0)).orElseThrow();
    return switch (given.get(0)) {
      case "cylinder" ->
          Fields.of(value, issues, "inner_diameter", "length", "lying").flatMap(this::cylinder);
      case "sphere" ->
          Fields.of(value, issues, "inner_diameter")
              .flatMap(sphere -> quantities.number(sphere, "inner_diameter", InputKind.DIAMETER))
              .map(WallShape.Sphere::new);
      default ->
          Fields.of(value, issues, "area")
              .flatMap(plate -> quantities.number(plate, "area", InputKind.AREA))
              .map(WallShape.Plate::new);
    };
  }

  private Optional<WallShape> cylinder(Fields fields) {
    Optional<Double> diameter = quantities.number(fields, "inner_diameter", InputKind.DIAMETER);
    Optional<Double> length = quantities.number(fields, "length", InputKind.VESSEL_LENGTH);
    Optional<Boolean> lying =
        fields.has("lying")
            ? fields.find("lying").flatMap(value -> Texts.truth(value, issues))
            : Optional.of(false);
    if (diameter.isEmpty() || length.isEmpty() || lying.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(new WallShape.Cylinder(diameter.get(), length.get(), lying.get()));
  }

  private Optional<List<Layer>> layers(Value value) {
    List<Value> items = Lists.items(value, 1, MOST_LAYERS, issues);
    List<Layer> read = new ArrayList<>();
    for (Value item : items) {
      layers.read(item).ifPresent(read::add);
    }
    return Optional.of(read).filter(all -> !all.isEmpty() && all.size() == items.size());
  }

  private Optional<InsideFilm> inside(Value value) {
    if (value.node() instanceof YamlNode.Table) {
      return Fields.of(value, issues, "film_coefficient")
          .flatMap(fields -> film(fields, InsideFilm.Given::new));
    }
    return Texts.choice(value, "heat transfer", List.of(CORRELATION), issues)
        .map(word -> new InsideFilm.Correlation());
  }

  private Optional<OutsideFilm> outside(Value value) {
    if (value.node() instanceof YamlNode.Table) {
      return Fields.of(value, issues, "film_coefficient", "wind").flatMap(this::outsideByNumber);
    }
    if (value.node() instanceof YamlNode.Text text && text.value().equals("wind")) {
      issues.add(value.place(), "wind needs its speed", "write {wind: 3 m/s}");
      return Optional.empty();
    }
    return Texts.choice(value, "surroundings", OUTSIDE_WORDS.keySet(), issues)
        .map(OUTSIDE_WORDS::get);
  }

  private Optional<OutsideFilm> outsideByNumber(Fields fields) {
    if (fields.has("film_coefficient") == fields.has("wind")) {
      issues.add(
          fields.owner().key(),
          fields.owner().path() + " needs either film_coefficient or wind",
          "write {film_coefficient: 8 W/(m2 K)} or {wind: 3 m/s}");
      return Optional.empty();
    }
    return fields.has("wind")
        ? quantities.number(fields, "wind", InputKind.WIND_SPEED).map(OutsideFilm.Wind::new)
        : film(fields, OutsideFilm.Given::new);
  }

  private <T> Optional<T> film(Fields fields, Function<Interval, T> made) {
    return quantities
        .needed(fields, "film_coefficient", InputKind.FILM_COEFFICIENT)
        .map(quantity -> made.apply(quantity.si()));
  }
}
