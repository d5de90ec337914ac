package org.gasmargin.process.modelled;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Event;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;

/**
 * The phases of a step as one path.
 *
 * @param phases in order, at least one
 */
record JoinedPhases(List<Phase> phases) {

  JoinedPhases {
    phases = List.copyOf(phases);
  }

  /** The path over the whole step. */
  Path path() {
    List<Path> parts = phases.stream().map(phase -> phase.recorder().path()).toList();
    if (parts.size() == 1) {
      return parts.get(0);
    }
    List<PathPoint> points = new ArrayList<>();
    for (int i = 0; i < parts.size(); i++) {
      double begin = phases.get(i).begin();
      List<PathPoint> own = parts.get(i).points();
      own.subList(i == 0 ? 0 : 1, own.size()).forEach(point -> points.add(later(point, begin)));
    }
    return new Path(
        points,
        parts.stream().mapToDouble(Path::peakGasTemperature).max().orElseThrow(),
        parts.stream().mapToDouble(Path::lowestGasTemperature).min().orElseThrow(),
        parts.stream().mapToDouble(Path::peakPressure).max().orElseThrow(),
        parts.stream().mapToDouble(Path::lowestPressure).min().orElseThrow(),
        OptionalDouble.of(all(parts, Path::peakWallTemperature).max().orElseThrow()),
        OptionalDouble.of(all(parts, Path::lowestWallTemperature).min().orElseThrow()));
  }

  /** The balances: remainders of all phases added up. */
  Closure closure() {
    double mass = 0;
    double energy = 0;
    for (Phase phase : phases) {
      Closure part = new Balance(phase.system()).closure(phase.trajectory());
      mass += part.massRelative();
      energy += part.energyRelative();
    }
    return new Closure(mass, energy);
  }

  /** The events of all phases. */
  List<Event> events() {
    return phases.stream().flatMap(phase -> phase.events().stream()).toList();
  }

  /** The instants of all phases. */
  List<PathRecorder.Sample> samples() {
    return phases.stream().flatMap(phase -> phase.recorder().samples().stream()).toList();
  }

  /** The last phase. */
  Phase last() {
    return phases.get(phases.size() - 1);
  }

  private static java.util.stream.DoubleStream all(
      List<Path> parts, Function<Path, OptionalDouble> extreme) {
    return parts.stream().map(extreme).flatMapToDouble(OptionalDouble::stream);
  }

  private static PathPoint later(PathPoint point, double begin) {
    return new PathPoint(
        begin + point.time(),
        point.pressure(),
        point.temperature(),
        point.mass(),
        point.massFlow(),
        point.innerWall(),
        point.meanWall());
  }
}
