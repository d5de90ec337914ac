package org.gasmargin.process.modelled;

import java.util.EnumMap;
import java.util.EnumSet;
import java.util.Map;
import java.util.Set;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;

/**
 * Where within its tolerance each input is taken for one run: -1 lowest, 0 nominal, 1 highest. An
 * input that is not named is nominal.
 *
 * @param positions position of each input that is not nominal, from -1 to 1
 */
public record ModelInputs(Map<UncertainInput, Double> positions) {

  /** Every input at its nominal value. */
  public static final ModelInputs NOMINAL = new ModelInputs(Map.of());

  /** Copies the map; refuses a position beyond the tolerance. */
  public ModelInputs {
    positions = Map.copyOf(positions);
    for (double position : positions.values()) {
      if (!(Math.abs(position) <= 1)) {
        throw new IllegalArgumentException("a position lies between -1 and 1");
      }
    }
  }

  /** The same inputs with one of them elsewhere. */
  public ModelInputs with(UncertainInput input, double position) {
    Map<UncertainInput, Double> changed = new EnumMap<>(UncertainInput.class);
    changed.putAll(positions);
    changed.put(input, position);
    return new ModelInputs(changed);
  }

  /** Position of an input. */
  public double position(UncertainInput input) {
    return positions.getOrDefault(input, 0.0);
  }

  /** The number that an interval stands for in this run. */
  public double value(UncertainInput input, Interval interval) {
    return interval.at(position(input));
  }

  /** The inputs whose tolerance or uncertainty can change the modelled path of a step. */
  public static Set<UncertainInput> uncertain(Site site, Vessel vessel, Step step) {
    Set<UncertainInput> found = EnumSet.noneOf(UncertainInput.class);
    add(found, UncertainInput.START_PRESSURE, vessel.startPressure());
    add(found, UncertainInput.START_TEMPERATURE, vessel.startTemperature());
    add(found, UncertainInput.START_WALL_TEMPERATURE, vessel.startWallTemperature());
    add(found, UncertainInput.VOLUME, vessel.volume());
    add(found, UncertainInput.AMBIENT_TEMPERATURE, site.ambientTemperature());
    add(found, UncertainInput.ATMOSPHERIC_PRESSURE, site.atmosphericPressure());
    vessel.wall().ifPresent(wall -> addWall(found, wall));
    if (step instanceof Step.Fill fill) {
      add(found, UncertainInput.SUPPLY_PRESSURE, fill.supply().pressure());
      add(found, UncertainInput.SUPPLY_TEMPERATURE, fill.supply().temperature());
      addDrive(found, fill.drive());
    } else if (step instanceof Step.Vent vent) {
      addDrive(found, vent.drive());
    } else if (step instanceof Step.Compress compress) {
      add(found, UncertainInput.UNTIL, compress.until());
    }
    return found;
  }

  private static void addWall(Set<UncertainInput> found, Wall wall) {
    wall.layers().forEach(l -> add(found, UncertainInput.WALL_THICKNESS, l.thickness()));
    if (wall.inside() instanceof InsideFilm.Given given) {
      add(found, UncertainInput.FILM_INSIDE, given.coefficient());
    } else {
      found.add(UncertainInput.FILM_INSIDE);
    }
    if (wall.outside() instanceof OutsideFilm.Given given) {
      add(found, UncertainInput.FILM_OUTSIDE, given.coefficient());
    } else if (!(wall.outside() instanceof OutsideFilm.Insulated)) {
      found.add(UncertainInput.FILM_OUTSIDE);
    }
  }

  private static void addDrive(Set<UncertainInput> found, Drive drive) {
    if (drive instanceof Drive.PressureRamp ramp) {
      add(found, UncertainInput.UNTIL, ramp.until());
    } else if (drive instanceof Drive.MassFlow flow) {
      add(found, UncertainInput.MASS_FLOW, flow.massFlow());
    } else if (drive instanceof Drive.Orifice orifice) {
      add(found, UncertainInput.ORIFICE_DIAMETER, orifice.diameter());
      add(found, UncertainInput.DISCHARGE_COEFFICIENT, orifice.dischargeCoefficient());
      orifice.until().ifPresent(until -> add(found, UncertainInput.UNTIL, until));
    }
  }

  private static void add(Set<UncertainInput> found, UncertainInput input, Interval interval) {
    if (!interval.isExact()) {
      found.add(input);
    }
  }
}
