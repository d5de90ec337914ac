package org.gasmargin.process.simulation;

import java.util.Optional;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.bounds.BoundStep;
import org.gasmargin.process.modelled.ModelInputs;
import org.gasmargin.process.modelled.ModelledStep;
import org.gasmargin.process.modelled.ModelledVessel;
import org.gasmargin.process.modelled.VesselCondition;
import org.gasmargin.vessel.Vessel;

/** Carries the modelled condition of one vessel from step to step, at one choice of the inputs. */
final class ModelledTrack {
  private final String name;
  private final ModelledVessel vessel;
  private Optional<VesselCondition> condition;
  private String lost = "";
  private double clock;

  ModelledTrack(Vessel vessel, Site site, ModelInputs inputs) {
    this.name = vessel.name();
    this.vessel = new ModelledVessel(vessel, site, inputs);
    this.condition = startOf(this.vessel);
  }

  private Optional<VesselCondition> startOf(ModelledVessel modelled) {
    try {
      return Optional.of(modelled.start());
    } catch (OutsideValidity refused) {
      lost = String.valueOf(refused.getMessage());
      return Optional.empty();
    }
  }

  /** Time since the start of the job at which the latest step ended, s. */
  double clock() {
    return clock;
  }

  /**
   * Runs a step; a vessel that waited while another was at work is held for that time first.
   *
   * @param step the step
   * @param begin time since the start of the job, s
   * @param bound the bounds of the step, for its duration where nothing is modelled
   */
  ModelledStep advance(Step step, double begin, BoundStep bound) {
    if (begin > clock) {
      run(new Step.Hold("waiting", name, begin - clock));
      clock = begin;
    }
    ModelledStep result = run(step);
    clock += duration(result.outcome()).orElse(duration(bound).orElse(0.0));
    return result;
  }

  /** Runs a step in sequence, without a clock. */
  ModelledStep run(Step step) {
    if (condition.isEmpty()) {
      return ModelledStep.without(new PathOutcome.Failed(lost));
    }
    ModelledStep result = vessel.run(step, condition.get());
    condition = result.end();
    if (condition.isEmpty()) {
      lost = "an earlier step left no modelled state of the whole gas to start from";
    }
    return result;
  }

  private static Optional<Double> duration(PathOutcome outcome) {
    return outcome instanceof PathOutcome.Computed computed
        ? Optional.of(computed.path().duration())
        : Optional.empty();
  }

  private static Optional<Double> duration(BoundStep bound) {
    PathOutcome adiabatic = bound.paths().get(PathKind.ADIABATIC);
    return adiabatic instanceof PathOutcome.Computed computed
        ? Optional.of(computed.path()).map(Path::duration)
        : Optional.empty();
  }
}
