package org.gasmargin.job;

import java.util.List;
import java.util.regex.Pattern;
import org.gasmargin.yaml.Issue;

/**
 * Tells errors of structure, which a schema can see, from errors of value, which it cannot: names
 * that must be known, units and dimensions, magnitudes, and values that must fit each other.
 */
final class StructuralIssues {
  private static final Pattern VALUE =
      Pattern.compile(
          String.join(
              "|",
              "^is .* meant\\?.*",
              "^do volume and wall belong together.*",
              "^nothing is in question.*",
              "^unknown (gas|material|vessel|supply|rule pack|unit) .*",
              ".* is not (above|below) .*",
              ".* is above (1,|the pressure of).*",
              ".* is below the atmosphere.*",
              ".* is an? .* was expected",
              ".* reaches zero within its tolerance",
              ".* is negative, .*",
              ".*(percentage of a temperature|read in two ways|tolerance|mixtures of gases).*",
              "^the shares of .*",
              "^the atmosphere itself .*",
              "^missing key 'vessel' .*",
              ".* is too large a number",
              ".* letters is no quantity",
              ".* is a point on the pressure scale.*"));

  private StructuralIssues() {}

  static List<Issue> of(JobErrors errors) {
    return errors.issues().stream()
        .filter(issue -> !VALUE.matcher(issue.problem()).matches())
        .toList();
  }
}
