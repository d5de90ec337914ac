package org.gasmargin.worksheet;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.gasmargin.rules.Finding;

/** The cautions of a sheet: those that always hold and those of its findings. */
final class Cautions {
  /** Heads every list of cautions. */
  static final String DEFERENCE =
      "This sheet predicts; it gives no permission and replaces no examination. Local codes, the"
          + " nameplate and documents of the equipment, and licensed inspection decide, and they"
          + " prevail over any number on these pages.";

  private static final String ALWAYS =
      "Never exceed a marked pressure or temperature because a calculation allows it. Gauges,"
          + " plates and gas labels were taken as stated: a wrong input makes a wrong page.";

  private Cautions() {}

  /** The cautions that always hold, then those of some findings; no sentence stands twice. */
  static String of(List<Finding> findings) {
    Set<String> sentences = new LinkedHashSet<>(sentences(ALWAYS));
    findings.forEach(finding -> sentences.addAll(sentences(finding.caution())));
    return String.join(" ", sentences);
  }

  /** The sentences of a group's caution that no other rule shares. */
  static String ownOf(FindingGroup group, List<Finding> all) {
    Set<String> shared = new LinkedHashSet<>();
    for (Finding finding : all) {
      if (!finding.rule().equals(group.first().rule())) {
        shared.addAll(sentences(finding.caution()));
      }
    }
    return sentences(group.first().caution()).stream()
        .filter(sentence -> !shared.contains(sentence))
        .collect(Collectors.joining(" "));
  }

  private static List<String> sentences(String text) {
    return text.isBlank() ? List.of() : List.of(Prose.sentence(text).split("(?<=[.!?]) +", -1));
  }
}
