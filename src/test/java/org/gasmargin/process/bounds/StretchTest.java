package org.gasmargin.process.bounds;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.IdealGas;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.Stretch;
import org.gasmargin.process.Supply;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.Vessel;
import org.junit.jupiter.api.Test;

/**
 * The stretch told with an extreme, redone with closed forms of the ideal gas. Source: textbook
 * formulas, value from memory.
 */
class StretchTest {
  private static final Gas GAS = IdealGas.diatomic("air", 0.029);
  private static final double GAMMA = 1.4;
  private static final Interval AMBIENT = Interval.around(293.15, 10);

  @Test
  void hottestFillBeginsWhereItsStretchSays() {
    Extreme hottest = fill(track()).highestGasTemperature().orElseThrow();
    Stretch stretch = hottest.stretch().orElseThrow();
    double ratio = stretch.startPressure() / stretch.endPressure();
    double supply = GAMMA * 303.15;
    double redone = supply / (1 + ratio * (supply / stretch.startTemperature() - 1));
    assertEquals(100e5, stretch.endPressure(), 1);
    assertEquals(hottest.value(), stretch.endTemperature());
    assertEquals(redone, hottest.value(), 1e-6);
  }

  @Test
  void coldestVentAfterAHotFillBeginsWithSettledGas() {
    BoundTrack track = track();
    fill(track);
    Extreme coldest =
        track
            .advance(
                new Step.Vent("2", "v", new Drive.PressureRamp(Interval.exactly(5e5), 60)),
                track.surroundings())
            .envelope()
            .lowestGasTemperature()
            .orElseThrow();
    Stretch stretch = coldest.stretch().orElseThrow();
    assertEquals(AMBIENT.low(), stretch.startTemperature(), 1e-9, coldest.path());
    double ratio = stretch.endPressure() / stretch.startPressure();
    double redone = stretch.startTemperature() * Math.pow(ratio, (GAMMA - 1) / GAMMA);
    assertEquals(redone, coldest.value(), 1e-6);
  }

  @Test
  void highestPressureOfAHoldIsReachedAtConstantVolume() {
    BoundTrack track = track();
    fill(track);
    Extreme highest =
        track
            .advance(new Step.Hold("2", "v", 600), track.surroundings())
            .envelope()
            .highestPressure()
            .orElseThrow();
    Stretch stretch = highest.stretch().orElseThrow();
    double redone = stretch.startPressure() * stretch.endTemperature() / stretch.startTemperature();
    assertTrue(highest.value() > 100e5, highest.path());
    assertEquals(redone, highest.value(), 1e-3);
  }

  @Test
  void extremeAtTheStartOfAStepHasNoStretch() {
    BoundTrack track = track();
    fill(track);
    Extreme highest =
        track
            .advance(
                new Step.Vent("2", "v", new Drive.PressureRamp(Interval.exactly(5e5), 60)),
                track.surroundings())
            .envelope()
            .highestGasTemperature()
            .orElseThrow();
    assertEquals(Optional.empty(), highest.stretch(), highest.path());
  }

  private static Envelope fill(BoundTrack track) {
    return track
        .advance(
            new Step.Fill(
                "1",
                "v",
                new Supply("bank", Interval.exactly(300e5), AMBIENT),
                new Drive.PressureRamp(Interval.exactly(100e5), 60),
                OptionalDouble.empty()),
            track.surroundings())
        .envelope();
  }

  private static BoundTrack track() {
    return new BoundTrack(
        new Vessel(
            "v",
            GAS,
            Interval.exactly(0.05),
            Interval.exactly(10e5),
            Interval.exactly(293.15),
            Interval.exactly(293.15),
            Optional.empty()),
        new Site(AMBIENT, Interval.exactly(101_325)));
  }
}
