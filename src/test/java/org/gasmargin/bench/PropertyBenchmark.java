package org.gasmargin.bench;

import java.util.concurrent.TimeUnit;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.Warmup;

/**
 * Time of one property call. Each call gets another temperature and density, so that nothing can be
 * kept from the call before.
 */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 4, time = 1)
@org.openjdk.jmh.annotations.State(Scope.Thread)
public class PropertyBenchmark {
  private static final int STATES = 1024;

  @Param({"nitrogen"})
  private String gasId = "nitrogen";

  private Gas gas = new GasCatalogue().find("nitrogen").orElseThrow();
  private final State[] states = new State[STATES];
  private int next;

  /** States between 250 K and 500 K, 1 bar to 500 bar. */
  @Setup
  public void prepare() {
    gas = new GasCatalogue().find(gasId).orElseThrow();
    for (int i = 0; i < STATES; i++) {
      double share = (double) (i * 389 % STATES) / STATES;
      double temperature = 250 + 250 * share;
      double pressure = 1e5 * Math.pow(500, (double) i / STATES);
      states[i] = gas.atTemperaturePressure(temperature, pressure);
    }
  }

  private State state() {
    next = (next + 1) % STATES;
    return states[next];
  }

  /** (T, rho) to all properties. */
  @Benchmark
  public State fromTemperatureAndDensity() {
    State state = state();
    return gas.at(state.temperature(), state.molarDensity());
  }

  /** (rho, u) to all properties, from a temperature that is 1 % off, as in a time step. */
  @Benchmark
  public State fromDensityAndEnergy() {
    State state = state();
    return gas.atDensityEnergy(
        state.molarDensity(), state.internalEnergy(), 1.01 * state.temperature());
  }

  /** (T, p) to all properties. */
  @Benchmark
  public State fromTemperatureAndPressure() {
    State state = state();
    return gas.atTemperaturePressure(state.temperature(), state.pressure());
  }

  /** (p, s) to all properties. */
  @Benchmark
  public State fromPressureAndEntropy() {
    State state = state();
    return gas.atPressureEntropy(state.pressure(), state.entropy());
  }
}
