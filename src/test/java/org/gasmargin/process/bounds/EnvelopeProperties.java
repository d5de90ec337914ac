package org.gasmargin.process.bounds;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.LongRange;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.IdealGas;
import org.gasmargin.gas.State;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.Vessel;

/**
 * No sequence of steps with any exchange of heat in between leaves the envelope. The random paths
 * are followed by a scheme of their own: small stretches without heat exchange by the first law in
 * differences, each followed by a random part of the way to a random temperature of the
 * surroundings, and random settling between steps.
 */
class EnvelopeProperties {
  private static final double BAR = 1e5;
  private static final int STRETCHES = 400;

  @Property(tries = 150, seed = "20261201")
  void randomHeatExchangeOfAnIdealGasStaysInside(@ForAll @LongRange(min = 0) long seed) {
    Gas gas =
        seed % 2 == 0
            ? IdealGas.diatomic("diatomic", 0.028)
            : IdealGas.monatomic("monatomic", 0.004);
    assertStaysInside(gas, new Random(seed), STRETCHES);
  }

  @Property(tries = 30, seed = "20261201")
  void randomHeatExchangeOfARealGasStaysInside(@ForAll @LongRange(min = 0) long seed) {
    List<String> gases = List.of("nitrogen", "hydrogen", "methane", "helium", "air");
    Random random = new Random(seed);
    Gas gas = new GasCatalogue().find(gases.get(random.nextInt(gases.size()))).orElseThrow();
    assertStaysInside(gas, random, STRETCHES);
  }

  private static void assertStaysInside(Gas gas, Random random, int stretches) {
    Interval ambient = Interval.around(290 + 15 * random.nextDouble(), 6 * random.nextDouble());
    Site site = new Site(ambient, Interval.exactly(101325));
    Interval startPressure = Interval.around((2 + 60 * random.nextDouble()) * BAR, 0.4 * BAR);
    Interval startTemperature =
        Interval.around(280 + 30 * random.nextDouble(), 3 * random.nextDouble());
    Vessel vessel =
        new Vessel(
            "receiver",
            gas,
            Interval.exactly(0.05),
            startPressure,
            startTemperature,
            ambient,
            java.util.Optional.empty());
    BoundTrack track = new BoundTrack(vessel, site);
    Surroundings surroundings = track.surroundings();

    List<RandomWalk> walks = new ArrayList<>();
    for (int i = 0; i < 6; i++) {
      walks.add(
          new RandomWalk(
              gas,
              random,
              surroundings,
              gas.atTemperaturePressure(
                  within(startTemperature, random), within(startPressure, random))));
    }
    int steps = 1 + random.nextInt(4);
    double[] pressure = {startPressure.nominal()};
    for (int i = 0; i < steps; i++) {
      Step step = randomStep(gas, random, pressure);
      Envelope envelope = track.advance(step, surroundings).envelope();
      for (RandomWalk walk : walks) {
        walk.run(step, stretches);
        walk.assertInside(envelope, step);
      }
    }
  }

  private static double within(Interval interval, Random random) {
    return interval.low() + random.nextDouble() * (interval.high() - interval.low());
  }

  private static Step randomStep(Gas gas, Random random, double[] pressure) {
    switch (random.nextInt(5)) {
      case 0, 1 -> {
        pressure[0] = (pressure[0] / BAR + 5 + 120 * random.nextDouble()) * BAR;
        return new Step.Fill(
            "1",
            "receiver",
            new org.gasmargin.process.Supply(
                "bank",
                Interval.exactly(400 * BAR),
                Interval.around(260 + 60 * random.nextDouble(), 4)),
            new Drive.PressureRamp(Interval.around(pressure[0], 0.5 * BAR), 60),
            OptionalDouble.empty());
      }
      case 2 -> {
        pressure[0] = Math.max(0.4 * pressure[0], 1.5 * BAR);
        return new Step.Vent(
            "1", "receiver", new Drive.PressureRamp(Interval.around(pressure[0], 0.05 * BAR), 60));
      }
      case 3 -> {
        double mass = 0.02 * gas.molarMass() * pressure[0] / (8.3 * 300) * 0.05;
        return new Step.Fill(
            "1",
            "receiver",
            new org.gasmargin.process.Supply(
                "bank", Interval.exactly(400 * BAR), Interval.exactly(300)),
            new Drive.MassFlow(Interval.around(20 * mass / 60, 0.5 * mass / 60), 60),
            OptionalDouble.empty());
      }
      default -> {
        return new Step.Hold("1", "receiver", 100);
      }
    }
  }

  /** One vessel that exchanges heat at random. */
  private static final class RandomWalk {
    private final Gas gas;
    private final Random random;
    private final Surroundings surroundings;
    private State state;
    private double hottest;
    private double coldest;
    private double highest;
    private double lowest;

    RandomWalk(Gas gas, Random random, Surroundings surroundings, State start) {
      this.gas = gas;
      this.random = random;
      this.surroundings = surroundings;
      this.state = start;
    }

    void run(Step step, int stretches) {
      hottest = 0;
      coldest = 1e9;
      highest = 0;
      lowest = 1e12;
      note();
      double strength = Math.pow(random.nextDouble(), 3);
      settle(Math.pow(random.nextDouble(), 2));
      if (step instanceof Step.Hold) {
        for (int i = 0; i < 10; i++) {
          settle(random.nextDouble() * strength);
        }
      } else if (step instanceof Step.Fill fill) {
        double t0 = within(fill.supply().temperature(), random);
        double h = gas.atTemperaturePressure(t0, fill.supply().pressure().nominal()).enthalpy();
        PathLaw law = new PathLaw.Charging(h);
        if (fill.drive() instanceof Drive.PressureRamp ramp) {
          ramp(law, within(ramp.until(), random), strength, stretches, true);
        } else if (fill.drive() instanceof Drive.MassFlow flow) {
          double gained = within(flow.massFlow(), random) * 60 / (0.05 * gas.molarMass());
          double from = state.molarDensity();
          for (int i = 1; i <= stretches; i++) {
            state = law.atDensity(gas, state, from + gained * i / stretches);
            note();
            settle(random.nextDouble() * strength);
          }
        }
      } else if (step instanceof Step.Vent vent
          && vent.drive() instanceof Drive.PressureRamp ramp) {
        ramp(new PathLaw.Isentropic(), within(ramp.until(), random), strength, stretches, false);
      }
    }

    private void ramp(PathLaw law, double until, double strength, int stretches, boolean up) {
      double from = state.pressure();
      if (up ? from >= until : from <= until) {
        return;
      }
      for (int i = 1; i <= stretches; i++) {
        double p = from + (until - from) * i / stretches;
        state = law.atPressure(gas, state, p);
        note();
        double part = random.nextDouble() * strength;
        state = gas.atTemperaturePressure(towards(part), p);
        note();
      }
    }

    /** Exchange of heat at constant volume. */
    private void settle(double part) {
      state = gas.at(towards(part), state.molarDensity());
      note();
    }

    private double towards(double part) {
      double wall =
          surroundings.coldest()
              + random.nextDouble() * (surroundings.hottest() - surroundings.coldest());
      return state.temperature() + part * (wall - state.temperature());
    }

    private void note() {
      hottest = Math.max(hottest, state.temperature());
      coldest = Math.min(coldest, state.temperature());
      highest = Math.max(highest, state.pressure());
      lowest = Math.min(lowest, state.pressure());
    }

    void assertInside(Envelope envelope, Step step) {
      double hot = envelope.highestGasTemperature().orElseThrow().value();
      double cold = envelope.lowestGasTemperature().orElseThrow().value();
      double high = envelope.highestPressure().orElseThrow().value();
      double low = envelope.lowestPressure().orElseThrow().value();
      assertTrue(hottest <= hot * (1 + 1e-9), () -> step.kind() + ": " + hottest + " > " + hot);
      assertTrue(coldest >= cold * (1 - 1e-9), () -> step.kind() + ": " + coldest + " < " + cold);
      assertTrue(highest <= high * (1 + 1e-9), () -> step.kind() + ": " + highest + " > " + high);
      assertTrue(lowest >= low * (1 - 1e-9), () -> step.kind() + ": " + lowest + " < " + low);
    }
  }
}
