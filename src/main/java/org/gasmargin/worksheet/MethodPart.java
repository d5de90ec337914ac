package org.gasmargin.worksheet;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.ValidityRange;
import org.gasmargin.rules.NotApplied;
import org.gasmargin.rules.PackUsed;
import org.gasmargin.units.Dimension;
import org.gasmargin.worksheet.layout.Flow;
import org.gasmargin.worksheet.layout.Paragraph;
import org.gasmargin.worksheet.layout.Run;
import org.gasmargin.worksheet.layout.Style;
import org.gasmargin.worksheet.numbers.Scale;

/** How the numbers were made and how far the models hold. */
final class MethodPart {
  private static final int PACK_HASH_DIGITS = 16;

  private final WorksheetContent content;
  private final Scale temperature;
  private final Scale pressure;

  MethodPart(WorksheetContent content) {
    this.content = content;
    temperature = Scale.of(Dimension.TEMPERATURE, content.units());
    pressure = Scale.of(Dimension.ABSOLUTE_PRESSURE, content.units());
  }

  void write(Flow flow) {
    flow.section("Method, validity and sources");
    labelled(
        flow,
        "Method",
        "First law for the gas in each vessel with the real gas's equation of state, step by step."
            + " Every step is computed without heat exchange, at constant temperature, and with"
            + " heat passing into the wall where the wall is described. The extremes cover every"
            + " state that the earlier steps allow, with the tolerances of the inputs; the rules"
            + " judge on them.");
    for (Gas gas : gases()) {
      labelled(flow, gas.name(), validity(gas));
      new FittedRange(content, gas)
          .warning()
          .ifPresent(warning -> labelled(flow, "BEYOND THE FIT", warning));
    }
    WallSources.of(content.result().procedure())
        .forEach((name, text) -> labelled(flow, name, text));
    labelled(flow, "Rule packs", packs());
    notApplied().ifPresent(rules -> labelled(flow, "Rules that do not concern a step", rules));
    labelled(
        flow,
        "Identity",
        "Job file: SHA-256 "
            + content.inputsSha256()
            + ". Program: gasmargin "
            + content.programVersion()
            + ". A hash shows that nothing was changed; it is no signature.");
  }

  private static void labelled(Flow flow, String label, String text) {
    flow.add(Paragraph.of(new Run(label + ": ", Style.TABLE.strong()), new Run(text, Style.TABLE)));
    flow.gap(2);
  }

  private Collection<Gas> gases() {
    Map<String, Gas> gases = new LinkedHashMap<>();
    content
        .result()
        .procedure()
        .vessels()
        .forEach(vessel -> gases.putIfAbsent(vessel.gas().id(), vessel.gas()));
    return gases.values();
  }

  private String validity(Gas gas) {
    ValidityRange range = gas.validity();
    return Prose.sentence(gas.citation())
        + " Used from "
        + temperature.text(range.minTemperature(), 0)
        + " to "
        + temperature.text(range.maxTemperature(), 0)
        + " and up to "
        + pressure.text(range.maxPressure(), 0)
        + "; published for temperatures up to "
        + temperature.text(range.fittedMaxTemperature(), 0)
        + ".";
  }

  private String packs() {
    List<String> packs = new ArrayList<>();
    for (PackUsed pack : content.judgement().packs()) {
      String hash = pack.sha256();
      String start = hash.substring(0, Math.min(PACK_HASH_DIGITS, hash.length()));
      packs.add(pack.name() + " (" + pack.because() + "; SHA-256 " + start + "…)");
    }
    return String.join("; ", packs) + ".";
  }

  /** Reasons with the rules and steps to which they apply. */
  private Optional<String> notApplied() {
    Map<String, Set<String>> stepsByRule = new LinkedHashMap<>();
    Map<String, String> reasons = new LinkedHashMap<>();
    for (NotApplied rule : content.judgement().notApplied()) {
      String key = rule.rule() + "\n" + rule.reason();
      stepsByRule.computeIfAbsent(key, r -> new LinkedHashSet<>()).add(rule.step());
      reasons.put(key, Prose.tidy(rule.reason()));
    }
    Map<String, Set<String>> rulesByReason = new LinkedHashMap<>();
    reasons.forEach(
        (key, reason) ->
            rulesByReason
                .computeIfAbsent(
                    reason + " (step " + String.join(", ", stepsOf(stepsByRule, key)) + "): ",
                    r -> new LinkedHashSet<>())
                .add(key.substring(0, key.indexOf('\n'))));
    List<String> told = new ArrayList<>();
    rulesByReason.forEach((reason, rules) -> told.add(reason + String.join(", ", rules)));
    return told.isEmpty() ? Optional.empty() : Optional.of(String.join("; ", told) + ".");
  }

  private static Set<String> stepsOf(Map<String, Set<String>> stepsByRule, String key) {
    return stepsByRule.getOrDefault(key, Set.of());
  }
}
