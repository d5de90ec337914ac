package org.gasmargin.rules;

import java.util.List;
import java.util.stream.Collectors;
import org.gasmargin.yaml.TextIssue;

/** Rule packs that cannot be used. Nothing is judged with a part of them. */
public final class RulePackRefused extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<TextIssue> issues;

  RulePackRefused(List<TextIssue> issues) {
    super(issues.stream().map(TextIssue::toString).collect(Collectors.joining("\n")));
    this.issues = List.copyOf(issues);
  }

  /** Every error of every file, in the order of files and places. */
  public List<TextIssue> issues() {
    return issues;
  }
}
