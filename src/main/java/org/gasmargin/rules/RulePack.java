package org.gasmargin.rules;

import java.util.List;
import java.util.Optional;

/**
 * A named set of rules with the text from which it was read. Every rule in it passed the checks.
 */
public final class RulePack {
  private final String name;
  private final String title;
  private final Optional<Rule.Condition> askedBy;
  private final List<Rule> rules;
  private final String sha256;

  RulePack(
      String name,
      String title,
      Optional<Rule.Condition> askedBy,
      List<Rule> rules,
      String sha256) {
    this.name = name;
    this.title = title;
    this.askedBy = askedBy;
    this.rules = List.copyOf(rules);
    this.sha256 = sha256;
  }

  /** The name by which a job asks for it. */
  public String name() {
    return name;
  }

  /** What it is about, one line. */
  public String title() {
    return title;
  }

  /** Hash of the text, lower-case hexadecimal. */
  public String sha256() {
    return sha256;
  }

  /** The identifiers of its rules, in the order of the file. */
  public List<String> ruleIds() {
    return rules.stream().map(Rule::id).toList();
  }

  /** Runs the examples of every rule. */
  public List<ExampleOutcome> runExamples() {
    return rules.stream()
        .flatMap(rule -> rule.examples().stream().map(example -> ExampleRun.of(rule, example)))
        .toList();
  }

  /** The gas that asks for the pack without the job naming it. */
  Optional<Rule.Condition> askedBy() {
    return askedBy;
  }

  List<Rule> rules() {
    return rules;
  }
}
