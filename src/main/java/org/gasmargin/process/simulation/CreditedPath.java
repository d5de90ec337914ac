package org.gasmargin.process.simulation;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.process.modelled.ModelInputs;
import org.gasmargin.process.modelled.ModelledStep;
import org.gasmargin.process.modelled.UncertainInput;
import org.gasmargin.vessel.Correlation;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.Vessel;

/**
 * The modelled extremes of one vessel with all uncertainty set against the user. Every uncertain
 * input is first moved alone to both ends; for each step and each extreme, all inputs are then set
 * together to the ends that make it worse. The worst of all these runs counts.
 */
final class CreditedPath {
  private final Vessel vessel;
  private final Procedure procedure;
  private final List<Step> steps;
  private final Set<UncertainInput> uncertain = EnumSet.noneOf(UncertainInput.class);

  /** One result a step, for each run. */
  private final List<List<ModelledStep>> runs = new ArrayList<>();

  private CreditedPath(Vessel vessel, Procedure procedure) {
    this.vessel = vessel;
    this.procedure = procedure;
    this.steps =
        procedure.steps().stream().filter(step -> step.vessel().equals(vessel.name())).toList();
    for (Step step : steps) {
      uncertain.addAll(ModelInputs.uncertain(procedure.site(), vessel, step));
    }
  }

  /** Runs all variants of a vessel's steps; none if vessels wait for each other. */
  static CreditedPath of(Vessel vessel, Procedure procedure) {
    CreditedPath credited = new CreditedPath(vessel, procedure);
    if (procedure.vessels().size() > 1) {
      return credited;
    }
    credited.run(ModelInputs.NOMINAL);
    List<Effect> effects = new ArrayList<>();
    for (UncertainInput input : credited.uncertain) {
      effects.add(
          new Effect(
              input,
              credited.run(ModelInputs.NOMINAL.with(input, -1)),
              credited.run(ModelInputs.NOMINAL.with(input, 1))));
    }
    credited.corners(effects).forEach(credited::run);
    return credited;
  }

  /** What moving one input to its ends does. */
  private record Effect(UncertainInput input, List<ModelledStep> low, List<ModelledStep> high) {

    /** The end that makes an extreme of a step worse: -1, 1, or 0 if neither does. */
    double worseEnd(int step, ModelledExtreme extreme) {
      OptionalDouble atLow = value(low.get(step), extreme);
      OptionalDouble atHigh = value(high.get(step), extreme);
      if (atLow.isEmpty() || atHigh.isEmpty() || atLow.getAsDouble() == atHigh.getAsDouble()) {
        return 0;
      }
      double worse = extreme.worse(atLow.getAsDouble(), atHigh.getAsDouble());
      return worse == atHigh.getAsDouble() ? 1 : -1;
    }
  }

  private Set<ModelInputs> corners(List<Effect> effects) {
    Set<ModelInputs> corners = new LinkedHashSet<>();
    for (int step = 0; step < steps.size(); step++) {
      for (ModelledExtreme extreme : ModelledExtreme.values()) {
        ModelInputs corner = ModelInputs.NOMINAL;
        for (Effect effect : effects) {
          double end = effect.worseEnd(step, extreme);
          if (end != 0) {
            corner = corner.with(effect.input(), end);
          }
        }
        corners.add(corner);
      }
    }
    return corners;
  }

  private List<ModelledStep> run(ModelInputs inputs) {
    ModelledTrack track = new ModelledTrack(vessel, procedure.site(), inputs);
    List<ModelledStep> results = steps.stream().map(track::run).toList();
    runs.add(results);
    return results;
  }

  /**
   * The extremes of a step; empty, with a note, if any variant could not be computed.
   *
   * @param step the step
   * @param note takes the reason
   */
  Optional<StepResult.Credited> extremes(Step step, Consumer<String> note) {
    if (runs.isEmpty()) {
      note.accept(
          "heat taken by the wall cannot be credited in a job of several vessels: how long each"
              + " waits for the others is not varied");
      return Optional.empty();
    }
    int index = steps.indexOf(step);
    for (List<ModelledStep> run : runs) {
      Optional<String> obstacle = obstacle(run.get(index));
      if (obstacle.isPresent()) {
        note.accept("heat taken by the wall cannot be credited: " + obstacle.get());
        return Optional.empty();
      }
    }
    return Optional.of(
        new StepResult.Credited(
            worst(index, ModelledExtreme.HIGHEST_GAS_TEMPERATURE).orElseThrow(),
            worst(index, ModelledExtreme.LOWEST_GAS_TEMPERATURE).orElseThrow(),
            worst(index, ModelledExtreme.HIGHEST_PRESSURE).orElseThrow(),
            worst(index, ModelledExtreme.LOWEST_PRESSURE).orElseThrow(),
            worst(index, ModelledExtreme.HIGHEST_WALL_TEMPERATURE),
            worst(index, ModelledExtreme.LOWEST_WALL_TEMPERATURE),
            allowance()));
  }

  private static Optional<String> obstacle(ModelledStep step) {
    if (step.extrapolated()) {
      return Optional.of("the film inside lies above the range of its correlation");
    }
    if (step.outcome() instanceof PathOutcome.Failed failed) {
      return Optional.of(failed.reason());
    }
    return step.outcome() instanceof PathOutcome.Absent absent
        ? Optional.of(absent.reason())
        : Optional.empty();
  }

  private OptionalDouble worst(int step, ModelledExtreme extreme) {
    return runs.stream()
        .map(run -> value(run.get(step), extreme))
        .flatMapToDouble(OptionalDouble::stream)
        .reduce(extreme::worse);
  }

  private static OptionalDouble value(ModelledStep step, ModelledExtreme extreme) {
    if (step.outcome() instanceof PathOutcome.Computed computed) {
      Path path = computed.path();
      return extreme.of(path);
    }
    return OptionalDouble.empty();
  }

  private String allowance() {
    if (uncertain.isEmpty()) {
      return "no input has a tolerance";
    }
    return "each of these at the end of its tolerance that is worse, alone and all together: "
        + uncertain.stream().map(this::words).collect(Collectors.joining(", "));
  }

  private String words(UncertainInput input) {
    boolean correlated =
        input == UncertainInput.FILM_INSIDE
            && vessel.wall().orElseThrow().inside() instanceof InsideFilm.Correlation;
    return correlated
        ? input.words() + " ± " + Math.round(100 * Correlation.JET_AND_NATURAL.uncertainty()) + " %"
        : input.words();
  }
}
