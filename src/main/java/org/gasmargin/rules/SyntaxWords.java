package org.gasmargin.rules;

import dev.cel.common.CelIssue;
import org.gasmargin.yaml.TextIssue;
import org.gasmargin.yaml.YamlNode.Scalar;

/** Puts a syntax error of the expression library into one line at its place in the file. */
final class SyntaxWords {
  private SyntaxWords() {}

  static TextIssue of(Scalar source, CelIssue issue) {
    String first = issue.getMessage().lines().findFirst().orElse("").strip();
    int column = issue.getSourceLocation().getColumn();
    return new TextIssue(
        column < 0 ? source.place() : source.placeOf(column),
        "'" + source.value() + "' is not an expression: " + first);
  }
}
