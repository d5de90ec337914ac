package org.gasmargin.job;

import java.util.List;
import java.util.stream.Collectors;
import org.gasmargin.yaml.Issue;

/** A job file that cannot be used, with everything that is wrong with it. */
public final class JobErrors extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<Issue> issues;

  /**
   * @param issues in the order of the file, at least one
   */
  public JobErrors(List<Issue> issues) {
    super(issues.stream().map(Issue::toString).collect(Collectors.joining("\n")));
    if (issues.isEmpty()) {
      throw new IllegalArgumentException("errors without an issue would hide what is wrong");
    }
    this.issues = List.copyOf(issues);
  }

  /** All that is wrong, in the order of the file. */
  public List<Issue> issues() {
    return issues;
  }
}
