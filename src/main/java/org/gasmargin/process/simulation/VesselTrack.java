package org.gasmargin.process.simulation;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.process.bounds.BoundStep;
import org.gasmargin.process.bounds.BoundTrack;
import org.gasmargin.process.bounds.Surroundings;
import org.gasmargin.process.modelled.ModelInputs;
import org.gasmargin.process.modelled.ModelledStep;
import org.gasmargin.vessel.Vessel;

/** One vessel on its way through a procedure. */
final class VesselTrack {
  private final BoundTrack bounds;
  private final ModelledTrack modelled;
  private final Optional<CreditedPath> credited;
  private Surroundings surroundings;

  VesselTrack(Vessel vessel, Procedure procedure, Credit credit) {
    this.bounds = new BoundTrack(vessel, procedure.site());
    this.surroundings = bounds.surroundings();
    this.modelled = new ModelledTrack(vessel, procedure.site(), ModelInputs.NOMINAL);
    this.credited =
        credit == Credit.MODELLED && vessel.wall().isPresent()
            ? Optional.of(CreditedPath.of(vessel, procedure))
            : Optional.empty();
  }

  /** Time since the start of the job at which the vessel's latest step ended, s. */
  double clock() {
    return modelled.clock();
  }

  /**
   * Runs the next step of this vessel.
   *
   * @param step the step
   * @param begin time since the start of the job, s
   */
  StepResult run(Step step, double begin) {
    BoundStep bound = bounds.advance(step, surroundings);
    ModelledStep model = modelled.advance(step, begin, bound);
    Map<PathKind, PathOutcome> paths = new EnumMap<>(PathKind.class);
    paths.putAll(bound.paths());
    paths.put(PathKind.MODELLED, model.outcome());
    List<String> notes = new ArrayList<>(model.notes());
    Optional<StepResult.Credited> credit =
        credited.flatMap(path -> path.extremes(step, notes::add));
    StepResult result =
        new StepResult(
            step,
            paths,
            bound.envelope(),
            credit,
            worst(bound.closure(), model.closure(), model.outcome()),
            bound.amount(),
            model.events(),
            notes,
            BoundsCheck.failure(bound.envelope(), model.outcome()));
    surroundings = after(bound.envelope(), model.outcome());
    return result;
  }

  /**
   * The wall that a step leaves behind may be as hot and as cold as the modelled wall was in it; if
   * the wall could not be modelled, as hot and as cold as the gas can have been.
   */
  private Surroundings after(Envelope envelope, PathOutcome outcome) {
    if (outcome instanceof PathOutcome.Computed computed) {
      Path path = computed.path();
      Surroundings next = surroundings;
      if (path.peakWallTemperature().isPresent() && path.lowestWallTemperature().isPresent()) {
        next = next.including(path.peakWallTemperature().getAsDouble());
        next = next.including(path.lowestWallTemperature().getAsDouble());
      }
      return next;
    }
    if (outcome instanceof PathOutcome.Failed) {
      Surroundings next = surroundings;
      if (envelope.highestGasTemperature().isPresent()) {
        next = next.including(envelope.highestGasTemperature().get().value());
      }
      if (envelope.lowestGasTemperature().isPresent()) {
        next = next.including(envelope.lowestGasTemperature().get().value());
      }
      return next;
    }
    return surroundings;
  }

  private static Optional<Closure> worst(
      Optional<Closure> bound, Optional<Closure> model, PathOutcome outcome) {
    if (!(outcome instanceof PathOutcome.Computed)) {
      return bound;
    }
    return bound.flatMap(
        a ->
            model.map(
                b ->
                    new Closure(
                        Math.max(a.massRelative(), b.massRelative()),
                        Math.max(a.energyRelative(), b.energyRelative()))));
  }
}
