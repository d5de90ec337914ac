package org.gasmargin.yaml;

/** A text that cannot be read as YAML, or that uses more of YAML than is accepted here. */
public final class YamlRefused extends Exception {
  private static final long serialVersionUID = 1L;

  private final transient TextIssue issue;

  YamlRefused(TextIssue issue) {
    super(issue.toString());
    this.issue = issue;
  }

  /** What is wrong, and where. */
  public TextIssue issue() {
    return issue;
  }
}
