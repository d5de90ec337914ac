package org.gasmargin.process.modelled;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeSet;
import org.gasmargin.gas.State;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathPoint;

/**
 * Reads a path off a solution: {@value #INTERVALS} equal intervals and the instants of events. The
 * extremes are taken over these points and over every step of the integration.
 */
final class PathRecorder {
  /** Number of equal intervals; a multiple of twelve. */
  static final int INTERVALS = 240;

  private final GasWallSystem system;
  private final List<Sample> samples = new ArrayList<>();
  private final List<Sample> stepEnds = new ArrayList<>();

  /**
   * One instant.
   *
   * @param time s
   * @param z unknowns
   * @param state of the gas
   * @param pressure Pa absolute: that of the state, or the one that is prescribed
   * @param innerSurface temperature of the inner surface, K
   * @param rate of the extent
   */
  @SuppressWarnings("ArrayRecordComponent") // never compared, never handed out of the package
  record Sample(
      double time, double[] z, State state, double pressure, double innerSurface, double rate) {}

  /** A recorder of solutions of a system. */
  PathRecorder(GasWallSystem system) {
    this.system = system;
  }

  /**
   * Records a solution.
   *
   * @param trajectory the solution
   * @param endPressure pressure at which an event ended it, Pa absolute
   */
  void record(Trajectory trajectory, OptionalDouble endPressure) {
    for (DenseStep step : trajectory.steps()) {
      stepEnds.add(sample(step.end(), step.endUnknowns()));
    }
    TreeSet<Double> times = new TreeSet<>();
    double end = trajectory.end();
    for (int i = 0; i < INTERVALS; i++) {
      times.add(end * i / INTERVALS);
    }
    trajectory.sightings().forEach(s -> times.add(s.time()));
    times.remove(end);
    DenseStep first = trajectory.steps().get(0);
    samples.add(sample(0, first.startUnknowns()));
    times.remove(0.0);
    DenseReading reading = new DenseReading(system);
    int index = 0;
    for (double time : times) {
      while (trajectory.steps().get(index).end() < time) {
        index++;
      }
      DenseStep step = trajectory.steps().get(index);
      samples.add(sample(time, reading.at(step, time)));
    }
    Sample last = stepEnds.remove(stepEnds.size() - 1);
    double lastPressure = endPressure.orElse(last.pressure());
    samples.add(
        new Sample(
            last.time(), last.z(), last.state(), lastPressure, last.innerSurface(), last.rate()));
  }

  /** Records a single instant. */
  void recordInstant(double[] z) {
    samples.add(sample(0, z));
  }

  /** The instants of the path. */
  List<Sample> samples() {
    return List.copyOf(samples);
  }

  /** The last instant. */
  Sample last() {
    return samples.get(samples.size() - 1);
  }

  /** The path. */
  Path path() {
    List<Sample> all = new ArrayList<>(samples);
    all.addAll(stepEnds);
    double hottest = Double.NEGATIVE_INFINITY;
    double coldest = Double.POSITIVE_INFINITY;
    double highest = Double.NEGATIVE_INFINITY;
    double lowest = Double.POSITIVE_INFINITY;
    double hottestWall = Double.NEGATIVE_INFINITY;
    double coldestWall = Double.POSITIVE_INFINITY;
    for (Sample sample : all) {
      double temperature = sample.state().temperature();
      double inner = sample.innerSurface();
      double outer = system.outerSurface(sample.z());
      hottest = Math.max(hottest, temperature);
      coldest = Math.min(coldest, temperature);
      highest = Math.max(highest, sample.pressure());
      lowest = Math.min(lowest, sample.pressure());
      hottestWall = Math.max(hottestWall, Math.max(inner, outer));
      coldestWall = Math.min(coldestWall, Math.min(inner, outer));
    }
    return new Path(
        samples.stream().map(this::point).toList(),
        hottest,
        coldest,
        highest,
        lowest,
        OptionalDouble.of(hottestWall),
        OptionalDouble.of(coldestWall));
  }

  private PathPoint point(Sample sample) {
    double[] z = sample.z();
    double molarMass = system.side().gas().molarMass();
    boolean rigid = system.side().content() instanceof Content.Rigid;
    return new PathPoint(
        sample.time(),
        sample.pressure(),
        z[GasWallSystem.TEMPERATURE],
        system.side().content().amount(z[GasWallSystem.EXTENT]) * molarMass,
        rigid ? sample.rate() * molarMass : 0,
        OptionalDouble.of(sample.innerSurface()),
        OptionalDouble.of(system.wall().meanTemperature(system.cells(z))));
  }

  /** What the vessel holds at the end; empty after the compression of trapped gas. */
  Optional<VesselCondition> end() {
    if (!(system.side().content() instanceof Content.Rigid rigid)) {
      return Optional.empty();
    }
    double[] z = last().z();
    List<Double> cells = new ArrayList<>();
    for (double cell : system.cells(z)) {
      cells.add(cell);
    }
    return Optional.of(
        new VesselCondition(
            rigid.vesselVolume(), z[GasWallSystem.EXTENT], z[GasWallSystem.TEMPERATURE], cells));
  }

  private Sample sample(double time, double[] z) {
    State state = system.gas(z);
    double[] rates = new double[z.length];
    system.rates(time, z, rates);
    double pressure =
        system.side().opening() instanceof Opening.Ramp ramp
            ? ramp.pressure(time)
            : state.pressure();
    return new Sample(
        time, z, state, pressure, system.innerSurface(z), rates[GasWallSystem.EXTENT]);
  }
}
