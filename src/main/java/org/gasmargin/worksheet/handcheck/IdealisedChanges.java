package org.gasmargin.worksheet.handcheck;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.vessel.Vessel;

/**
 * Work and heat of the classical changes that bound each step, for the ideal gas: what the wall
 * would have to take, or what the gas would have to give, if the step were such a change.
 */
public final class IdealisedChanges {
  private IdealisedChanges() {}

  /** The changes of all steps of which the bounds were computed. */
  public static List<IdealisedChange> of(ProcedureResult result) {
    List<IdealisedChange> changes = new ArrayList<>();
    for (StepResult step : result.steps()) {
      Vessel vessel = result.procedure().vesselOf(step.step());
      double ambient = result.procedure().site().ambientTemperature().nominal();
      PathKind kind = step.step() instanceof Step.Compress ? PathKind.UNMIXED : PathKind.ADIABATIC;
      Optional<Path> path = step.path(kind).or(() -> step.path(PathKind.ADIABATIC));
      path.ifPresent(p -> changes.addAll(of(step.step(), vessel, p, ambient)));
    }
    return changes;
  }

  private static List<IdealisedChange> of(Step step, Vessel vessel, Path path, double ambient) {
    double gamma = HeatCapacityRatio.of(vessel.gas(), path.first().temperature()).value().value();
    double volume = vessel.volume().nominal();
    double p1 = path.first().pressure();
    double t1 = path.first().temperature();
    double p2 = path.last().pressure();
    if (step instanceof Step.Fill fill) {
      double supply = fill.supply().temperature().nominal();
      double heat = RigidVessel.heatOfIsothermalCharge(gamma, supply, t1, p2 - p1, volume);
      return List.of(
          new IdealisedChange(
              step.id(),
              "constant temperature: gas let in and held at T₁",
              "0 (rigid)",
              "(p₂ − p₁) V (1 − γ T₀/T₁) / (γ − 1)",
              new IdealChange(0, heat)));
    }
    if (step instanceof Step.Hold) {
      double amountR = p1 * volume / t1;
      return List.of(
          new IdealisedChange(
              step.id(),
              "constant volume: gas settles from T₁ to ambient T₂",
              "0",
              "n cv (T₂ − T₁) = p₁ V (T₂/T₁ − 1) / (γ − 1)",
              IdealChange.isochoric(amountR, gamma, ambient - t1)));
    }
    if (step instanceof Step.Vent) {
      double startVolume = volume / IdealChange.volumeRatio(p2 / p1, gamma);
      return List.of(
          new IdealisedChange(
              step.id(),
              "no heat exchange: the gas that stays, from V (p₂/p₁)^(1/γ) to V",
              "(p₁V₁ − p₂V) / (γ − 1)",
              "0",
              IdealChange.adiabatic(p1 * startVolume, p2 * volume, gamma)),
          new IdealisedChange(
              step.id(),
              "constant temperature: the gas that stays, from V p₂/p₁ to V",
              "p₂ V ln(p₁/p₂)",
              "the same",
              IdealChange.isothermal(p2 * volume, p1 / p2)));
    }
    double endVolume = volume * IdealChange.volumeRatio(p2 / p1, gamma);
    return List.of(
        new IdealisedChange(
            step.id(),
            "no heat exchange: the trapped gas, from V to V (p₁/p₂)^(1/γ)",
            "(p₁V − p₂V₂) / (γ − 1)",
            "0",
            IdealChange.adiabatic(p1 * volume, p2 * endVolume, gamma)),
        new IdealisedChange(
            step.id(),
            "constant temperature: the trapped gas, from V to V p₁/p₂",
            "p₁ V ln(p₁/p₂)",
            "the same",
            IdealChange.isothermal(p1 * volume, p1 / p2)));
  }
}
