package org.gasmargin.process.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.LongRange;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.StepResult;

/** Laws that hold for every job. */
class SimulatorProperties {

  @Property(tries = 60, seed = "20261201")
  void theModelledPathLiesWithinTheEnvelopeAndClosesItsBalances(
      @ForAll @LongRange(min = 0) long seed) {
    Procedure procedure = RandomProcedures.of(new Random(seed));
    for (StepResult step : new Simulator().simulate(procedure, Credit.NONE).steps()) {
      String where = "seed " + seed + ", step " + step.step() + ", " + reason(step);
      Path modelled = step.path(PathKind.MODELLED).orElseThrow(() -> new AssertionError(where));
      assertEquals("", step.modelledCheckFailure().orElse(""), where);
      Envelope envelope = step.envelope();
      assertTrue(
          modelled.peakGasTemperature()
              <= envelope.highestGasTemperature().orElseThrow().value() + 0.01,
          where);
      assertTrue(
          modelled.lowestGasTemperature()
              >= envelope.lowestGasTemperature().orElseThrow().value() - 0.01,
          where);
      Closure closure = step.closure().orElseThrow(() -> new AssertionError(where));
      assertTrue(closure.holds(), () -> where + ": " + closure);
    }
  }

  @Property(tries = 12, seed = "20261201")
  void creditedExtremesHoldTheModelledPath(@ForAll @LongRange(min = 0) long seed) {
    Procedure procedure = RandomProcedures.of(new Random(seed));
    for (StepResult step : new Simulator().simulate(procedure, Credit.MODELLED).steps()) {
      Path modelled = step.path(PathKind.MODELLED).orElseThrow();
      StepResult.Credited credited = step.credited().orElseThrow();
      assertTrue(credited.highestGasTemperature() >= modelled.peakGasTemperature());
      assertTrue(credited.lowestGasTemperature() <= modelled.lowestGasTemperature());
      assertTrue(
          credited.lowestWallTemperature().orElseThrow()
              <= modelled.lowestWallTemperature().orElseThrow());
      assertTrue(
          credited.highestWallTemperature().orElseThrow()
              >= modelled.peakWallTemperature().orElseThrow());
    }
  }

  private static String reason(StepResult step) {
    return step.paths().get(PathKind.MODELLED) instanceof PathOutcome.Failed failed
        ? failed.reason()
        : "modelled";
  }
}
