package org.gasmargin.process.bounds;

import static org.gasmargin.process.bounds.Procedures.BAR;
import static org.gasmargin.process.bounds.Procedures.vessel;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.Site;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.Vessel;
import org.junit.jupiter.api.Test;

/** The envelope across steps. */
class EnvelopeTest {
  private static final Gas NITROGEN = new GasCatalogue().find("nitrogen").orElseThrow();
  private static final double AMBIENT = 293.15;

  private static BoundTrack track() {
    return new BoundTrack(vessel(NITROGEN, 0.05, 10 * BAR, AMBIENT), Procedures.site(AMBIENT));
  }

  @Test
  void aVentAfterAHotFillIsColdestFromSettledGas() {
    BoundTrack track = track();
    Surroundings room = track.surroundings();
    track.advance(Procedures.fill(300 * BAR, AMBIENT, 200 * BAR), room);
    Envelope vent = track.advance(Procedures.vent(50 * BAR), room).envelope();

    double full = NITROGEN.atTemperaturePressure(AMBIENT, 200 * BAR).entropy();
    double fromSettled = NITROGEN.atPressureEntropy(50 * BAR, full).temperature();
    assertEquals(fromSettled, vent.lowestGasTemperature().orElseThrow().value(), 1e-6);
    assertTrue(vent.lowestGasTemperature().orElseThrow().path().endsWith("vent without heat gain"));
  }

  @Test
  void aSoakAfterASlowFillReachesTheHighestPressureFromTheFullestVessel() {
    BoundTrack track = track();
    Surroundings room = track.surroundings();
    track.advance(Procedures.fill(300 * BAR, AMBIENT, 200 * BAR), room);
    Surroundings sun = room.including(338.15);
    Envelope soak = track.advance(Procedures.hold(3600), sun).envelope();

    double fullest = NITROGEN.atTemperaturePressure(AMBIENT, 200 * BAR).molarDensity();
    assertEquals(
        NITROGEN.at(338.15, fullest).pressure(), soak.highestPressure().orElseThrow().value(), 1);
    assertEquals(
        "fill held at 20 degC, then settled to 65 degC",
        soak.highestPressure().orElseThrow().path());
  }

  @Test
  void theLowestSettledPressureFollowsTheHottestFill() {
    BoundTrack track = track();
    Surroundings room = track.surroundings();
    Envelope fill = track.advance(Procedures.fill(300 * BAR, AMBIENT, 200 * BAR), room).envelope();
    Envelope hold = track.advance(Procedures.hold(3600), room).envelope();
    double hottest = fill.highestGasTemperature().orElseThrow().value();
    double emptiest = NITROGEN.atTemperaturePressure(hottest, 200 * BAR).molarDensity();
    assertEquals(
        NITROGEN.at(AMBIENT, emptiest).pressure(), hold.lowestPressure().orElseThrow().value(), 1);
  }

  @Test
  void tolerancesOfTheInputsWidenTheEnvelope() {
    Vessel toleranced =
        new Vessel(
            "receiver",
            NITROGEN,
            Interval.exactly(0.05),
            Interval.around(10 * BAR, BAR),
            Interval.around(AMBIENT, 4),
            Interval.exactly(AMBIENT),
            Optional.empty());
    BoundTrack wide =
        new BoundTrack(toleranced, new Site(Interval.around(AMBIENT, 4), Interval.exactly(101325)));
    Envelope widened =
        wide.advance(Procedures.fill(300 * BAR, AMBIENT, 200 * BAR), wide.surroundings())
            .envelope();
    double hottestCorner =
        Procedures.path(
                Procedures.bounds(
                    vessel(NITROGEN, 0.05, 9 * BAR, AMBIENT + 4),
                    Procedures.fill(300 * BAR, AMBIENT, 200 * BAR)),
                PathKind.ADIABATIC)
            .peakGasTemperature();
    assertEquals(hottestCorner, widened.highestGasTemperature().orElseThrow().value(), 1e-6);
    assertEquals(AMBIENT - 4, widened.lowestGasTemperature().orElseThrow().value(), 1e-9);
    double thinnest = NITROGEN.atTemperaturePressure(AMBIENT + 4, 9 * BAR).molarDensity();
    assertEquals(
        NITROGEN.at(AMBIENT - 4, thinnest).pressure(),
        widened.lowestPressure().orElseThrow().value(),
        1e-3);
  }

  @Test
  void whatFollowsALostStepIsUnknown() {
    BoundTrack track = track();
    Surroundings room = track.surroundings();
    track.advance(Procedures.fill(300 * BAR, AMBIENT, 200 * BAR), room);
    track.advance(Procedures.vent(1.1 * BAR), room);
    Envelope refill = track.advance(Procedures.fill(300 * BAR, AMBIENT, 50 * BAR), room).envelope();
    assertTrue(refill.highestGasTemperature().isEmpty());
    assertTrue(refill.highestPressure().isEmpty());
    assertTrue(refill.lowestGasTemperature().isEmpty());
  }
}
