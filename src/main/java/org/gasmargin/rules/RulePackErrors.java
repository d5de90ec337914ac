package org.gasmargin.rules;

import java.util.List;
import java.util.stream.Collectors;
import org.gasmargin.yaml.Issue;

/** Rule packs that cannot be used. Nothing is judged with a part of them. */
public final class RulePackErrors extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<Issue> issues;

  RulePackErrors(List<Issue> issues) {
    super(issues.stream().map(Issue::toString).collect(Collectors.joining("\n")));
    this.issues = List.copyOf(issues);
  }

  /** Every error of every file, in the order of files and places. */
  public List<Issue> issues() {
    return issues;
  }
}
