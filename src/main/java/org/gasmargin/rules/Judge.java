package org.gasmargin.rules;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.vessel.Vessel;

/** Holds rule packs against the results of a job. */
public final class Judge {
  private final JudgingCase subject;
  private final List<RulePack> packs;
  private final List<Finding> findings = new ArrayList<>();
  private final List<NotApplied> notApplied = new ArrayList<>();
  private final Map<String, PackUsed> used = new TreeMap<>();
  private final Map<String, Set<LimitKind>> limitsUsed = new TreeMap<>();

  /** By vessel: why nothing computed from here on may be judged. */
  private final Map<String, String> distrusted = new TreeMap<>();

  private Judge(JudgingCase subject, List<RulePack> packs) {
    this.subject = subject;
    this.packs = packs;
  }

  /**
   * Judges every step by the packs that the job asks for and by those that its gas asks for. Every
   * step gets at least one finding; a step that was not computed, a pack that is not there and a
   * limit that no rule looked at are findings too.
   *
   * @param subject the results with the user's limits
   * @param packs all packs that are there
   */
  public static Judgement judge(JudgingCase subject, List<RulePack> packs) {
    return new Judge(subject, packs).judge();
  }

  private Judgement judge() {
    Procedure procedure = subject.result().procedure();
    for (Step step : procedure.steps()) {
      judge(step);
    }
    addUnusedLimits(procedure);
    notApplied.sort(Comparator.comparing(NotApplied::rule));
    return new Judgement(subject.judgeOn(), findings, List.copyOf(used.values()), notApplied);
  }

  private void judge(Step step) {
    int before = findings.size();
    Optional<StepResult> result =
        subject.result().steps().stream().filter(r -> r.step().id().equals(step.id())).findFirst();
    Optional<Vessel> vessel =
        subject.result().procedure().vessels().stream()
            .filter(v -> v.name().equals(step.vessel()))
            .findFirst();
    for (String name : subject.requestedPacks()) {
      if (packs.stream().noneMatch(pack -> pack.name().equals(name))) {
        addOwn(step, "judging.unknown_pack", "there is no rule pack '" + name + "'");
      }
    }
    if (result.isEmpty() || vessel.isEmpty()) {
      addOwn(step, "judging.not_computed", "the step was not computed");
      distrustFrom(step, "it was not computed");
      return;
    }
    StepView view = view(result.get(), vessel.get());
    for (RulePack pack : packs) {
      if (isAsked(pack, view.operands())) {
        pack.rules().forEach(rule -> apply(rule, view));
      }
    }
    List<Finding> ofStep = findings.subList(before, findings.size());
    ofStep.sort(Comparator.comparing(Finding::rule));
    if (ofStep.isEmpty()) {
      addOwn(step, "judging.no_rule_applies", "no rule of the packs used applies to this step");
    }
  }

  private void apply(Rule rule, StepView view) {
    RuleOutcome outcome = RuleJudging.judge(rule, view);
    if (outcome instanceof RuleOutcome.Found found) {
      findings.add(found.finding());
      limitsUsed
          .computeIfAbsent(view.vessel(), name -> EnumSet.noneOf(LimitKind.class))
          .addAll(rule.limitsUsed());
    } else if (outcome instanceof RuleOutcome.Silent silent) {
      notApplied.add(silent.notApplied());
    }
  }

  private boolean isAsked(RulePack pack, Operands operands) {
    if (subject.requestedPacks().contains(pack.name())) {
      use(pack, "asked for by the job");
      return true;
    }
    Optional<Rule.Condition> met =
        pack.askedBy()
            .filter(c -> c.when().evaluate(operands) instanceof Operand.Truth t && t.holds());
    met.ifPresent(condition -> use(pack, "used " + condition.words()));
    return met.isPresent();
  }

  private void use(RulePack pack, String because) {
    used.putIfAbsent(pack.name(), new PackUsed(pack.name(), pack.sha256(), because));
  }

  private StepView view(StepResult result, Vessel vessel) {
    List<Limit> limits = limits(vessel.name());
    Optional<String> distrust =
        Optional.ofNullable(distrusted.get(vessel.name())).or(() -> distrust(result));
    distrust.ifPresent(why -> distrustFrom(result.step(), why));
    Operands operands =
        StepOperands.of(
            result,
            vessel,
            subject.result().procedure().site(),
            subject.judgeOn(),
            limits,
            distrust);
    return new StepView(
        result.step().id(), vessel.name(), operands, limits, distrust, subject.units());
  }

  /** What cannot be judged in one step cannot be the start of another. */
  private void distrustFrom(Step step, String why) {
    distrusted.putIfAbsent(step.vessel(), "step " + step.id() + " cannot be judged: " + why);
  }

  private List<Limit> limits(String vessel) {
    return subject.limits().getOrDefault(vessel, List.of());
  }

  /** Why nothing that was computed for a step may be judged. */
  private static Optional<String> distrust(StepResult result) {
    if (result.modelledCheckFailure().isPresent()) {
      return result.modelledCheckFailure();
    }
    if (result.closure().isEmpty()) {
      return Optional.of("the balances of mass and energy were not computed");
    }
    Closure closure = result.closure().get();
    if (!closure.holds()) {
      return Optional.of(
          String.format(
              Locale.ROOT,
              "the balances do not close: mass %.1e, energy %.1e, bound %.1e",
              closure.massRelative(),
              closure.energyRelative(),
              Closure.BOUND));
    }
    return Optional.empty();
  }

  private void addUnusedLimits(Procedure procedure) {
    for (Vessel vessel : procedure.vessels()) {
      Optional<Step> first =
          procedure.steps().stream().filter(s -> s.vessel().equals(vessel.name())).findFirst();
      Set<LimitKind> used = limitsUsed.getOrDefault(vessel.name(), Set.of());
      for (Limit limit : limits(vessel.name())) {
        if (first.isPresent() && !used.contains(limit.kind())) {
          addOwn(
              first.get(),
              "judging.unused_limit",
              "the job gives "
                  + limit.kind().key()
                  + ", but no rule of the packs used looked at it; ask for a pack that does");
        }
      }
    }
  }

  private void addOwn(Step step, String id, String reason) {
    findings.add(JudgingNote.of(step, id, reason));
  }
}
