package org.gasmargin.rules;

import static org.gasmargin.rules.ResultQuantity.HIGHEST_START_TEMPERATURE;
import static org.gasmargin.rules.ResultQuantity.LOWEST_AMBIENT_TEMPERATURE;

import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.gas.Hazard;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.units.Interval;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.Material;
import org.gasmargin.vessel.Vessel;

/** Fills the names of the rule language for one step. */
final class StepOperands {
  /** Polymers and composites conduct less, metals more, W/(m K). */
  private static final double POOREST_METAL = 2.0;

  private StepOperands() {}

  /**
   * The operands of a step.
   *
   * @param result what was computed for it
   * @param vessel the vessel that it acts on
   * @param site the surroundings
   * @param judgeOn bounds or modelled path
   * @param limits the user's limits of the vessel
   * @param distrust why nothing computed may be used, if so
   */
  static Operands of(
      StepResult result,
      Vessel vessel,
      Site site,
      JudgeOn judgeOn,
      List<Limit> limits,
      Optional<String> distrust) {
    Map<String, Operand> values = new HashMap<>();
    computed(result, vessel, judgeOn).copyTo(values);
    distrust.ifPresent(reason -> values.replaceAll((name, value) -> new Operand.Unknown(reason)));
    inputs(vessel, site, values);
    facts(result.step(), vessel).forEach((fact, value) -> values.put(fact.key(), value));
    limits(limits, values);
    return new Operands(values);
  }

  /** The names of the user's limits, and the facts that they are given. */
  static void limits(List<Limit> limits, Map<String, Operand> values) {
    for (LimitKind kind : LimitKind.values()) {
      Optional<Interval> given =
          limits.stream().filter(l -> l.kind() == kind).map(l -> l.value().si()).findFirst();
      values.put(Vocabulary.given(kind), new Operand.Truth(given.isPresent()));
      values.put(
          Vocabulary.limit(kind),
          given
              .map(interval -> kind.isMinimum() ? interval.high() : interval.low())
              .map(si -> Operand.number(new Measure(kind.dimension(), si), "", kind.key()))
              .orElse(new Operand.Unknown("the limit " + kind.key() + " is missing")));
    }
  }

  private static StepValues computed(StepResult result, Vessel vessel, JudgeOn judgeOn) {
    StepValues values = new StepValues();
    boolean trapped = result.step() instanceof Step.Compress;
    if (judgeOn == JudgeOn.MODELLED && !trapped) {
      ModelledValues.add(result, values);
    } else {
      EnvelopeValues.add(result, values);
    }
    EnvelopeValues.addUnmixed(result, values);
    SettledValues.add(result, vessel.gas(), values);
    return values;
  }

  private static void inputs(Vessel vessel, Site site, Map<String, Operand> values) {
    StepValues inputs = new StepValues();
    double highest =
        Math.max(
            site.ambientTemperature().high(),
            Math.max(vessel.startTemperature().high(), vessel.startWallTemperature().high()));
    inputs.put(HIGHEST_START_TEMPERATURE, highest, "");
    inputs.put(LOWEST_AMBIENT_TEMPERATURE, site.ambientTemperature().low(), "");
    inputs.copyTo(values);
  }

  private static Map<Fact, Operand> facts(Step step, Vessel vessel) {
    Map<Fact, Operand> all = new EnumMap<>(Fact.class);
    all.put(Fact.STEP_KIND, new Operand.Word(step.kind()));
    all.put(Fact.GAS_ID, new Operand.Word(vessel.gas().id()));
    all.put(Fact.OXIDISER, hazard(vessel, Hazard.OXIDISER));
    all.put(Fact.FLAMMABLE, hazard(vessel, Hazard.FLAMMABLE));
    all.put(Fact.ASPHYXIANT, hazard(vessel, Hazard.ASPHYXIANT));
    all.put(Fact.TOXIC, hazard(vessel, Hazard.TOXIC));
    all.put(Fact.TRAPPED, new Operand.Truth(step instanceof Step.Compress));
    all.put(Fact.HAS_WALL, new Operand.Truth(vessel.wall().isPresent()));
    all.put(Fact.LINER_IS_POLYMER, new Operand.Truth(hasPolymerLiner(vessel)));
    return all;
  }

  private static Operand hazard(Vessel vessel, Hazard hazard) {
    return new Operand.Truth(vessel.gas().hazards().contains(hazard));
  }

  private static boolean hasPolymerLiner(Vessel vessel) {
    return vessel
        .wall()
        .map(wall -> wall.layers().get(0))
        .map(Layer::material)
        .map(Material::points)
        .filter(points -> points.stream().allMatch(p -> p.conductivity() < POOREST_METAL))
        .isPresent();
  }
}
