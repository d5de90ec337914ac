package org.gasmargin.job;

import java.util.Optional;
import org.gasmargin.gas.Gas;
import org.gasmargin.process.Site;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Interval;
import org.gasmargin.units.Quantity;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;
import org.gasmargin.vessel.WallShape;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Value;

/** Reads one vessel with its start. Its limits are read by {@link LimitReader}. */
final class VesselReader {
  private static final double MOST_VOLUME_RATIO = 2;

  private final GasReader gases;
  private final WallReader walls;
  private final Quantities quantities;
  private final Issues issues;

  VesselReader(GasReader gases, WallReader walls, Quantities quantities) {
    this.gases = gases;
    this.walls = walls;
    this.quantities = quantities;
    issues = quantities.issues();
  }

  /**
   * The vessel, or empty after an issue was added.
   *
   * @param site gives the temperature of the wall unless the job does
   */
  Optional<Vessel> read(Fields fields, String name, Optional<Site> site) {
    Optional<Gas> gas = fields.need("gas").flatMap(gases::read);
    Optional<Quantity> volume = quantities.needed(fields, "volume", InputKind.VOLUME);
    Optional<Start> start = fields.need("start").flatMap(value -> start(value, site));
    Optional<Wall> wall = fields.find("wall").flatMap(walls::read);
    if (wall.isPresent() && volume.isPresent()) {
      compareWithShape(fields, volume.get(), wall.get().shape());
    }
    if (gas.isEmpty()
        || volume.isEmpty()
        || start.isEmpty()
        || fields.has("wall") != wall.isPresent()) {
      return Optional.empty();
    }
    return Optional.of(
        new Vessel(
            name,
            gas.get(),
            volume.get().si(),
            start.get().pressure(),
            start.get().temperature(),
            start.get().wallTemperature(),
            wall));
  }

  private record Start(Interval pressure, Interval temperature, Interval wallTemperature) {}

  private Optional<Start> start(Value value, Optional<Site> site) {
    return Fields.of(value, issues, "pressure", "temperature", "wall_temperature")
        .flatMap(
            fields -> {
              Optional<Quantity> pressure =
                  quantities.needed(fields, "pressure", InputKind.PRESSURE);
              Optional<Quantity> temperature =
                  quantities.needed(fields, "temperature", InputKind.GAS_TEMPERATURE);
              Optional<Interval> wall =
                  fields.has("wall_temperature")
                      ? quantities
                          .needed(fields, "wall_temperature", InputKind.WALL_TEMPERATURE)
                          .map(Quantity::si)
                      : site.map(Site::ambientTemperature);
              if (pressure.isEmpty() || temperature.isEmpty() || wall.isEmpty()) {
                return Optional.empty();
              }
              return Optional.of(
                  new Start(pressure.get().si(), temperature.get().si(), wall.get()));
            });
  }

  private void compareWithShape(Fields fields, Quantity volume, WallShape shape) {
    double enclosed = enclosedVolume(shape);
    double ratio = volume.si().nominal() / enclosed;
    if (ratio > MOST_VOLUME_RATIO || ratio < 1 / MOST_VOLUME_RATIO) {
      String path = fields.owner().path() + ".wall";
      quantities
          .confirmations()
          .ask(
              path,
              fields.find("wall").orElseThrow().key(),
              "do volume and wall belong together? The volume is "
                  + volume.typed()
                  + ", the wall encloses "
                  + DisplayUnits.of(volume.unit(), 0).format(enclosed, Dimension.VOLUME));
    }
  }

  /** The volume within a closed shape, m3; NaN for a plate, which closes nothing. */
  private static double enclosedVolume(WallShape shape) {
    if (shape instanceof WallShape.Cylinder cylinder) {
      return Math.PI / 4 * cylinder.innerDiameter() * cylinder.innerDiameter() * cylinder.length();
    }
    if (shape instanceof WallShape.Sphere sphere) {
      return Math.PI / 6 * Math.pow(sphere.innerDiameter(), 3);
    }
    return Double.NaN;
  }
}
