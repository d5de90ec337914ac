package org.gasmargin.job;

import java.util.Optional;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;

/**
 * What a job is called.
 *
 * @param title never empty
 * @param number may be empty
 * @param revision may be empty
 * @param preparedBy may be empty
 */
record Head(String title, String number, String revision, String preparedBy) {

  /** Reads {@code job}; empty after an issue was added. */
  static Optional<Head> read(Value value, Issues issues) {
    return Fields.of(value, issues, "title", "number", "revision", "prepared_by")
        .flatMap(
            fields ->
                fields
                    .need("title")
                    .flatMap(title -> Texts.word(title, issues))
                    .map(
                        title ->
                            new Head(
                                title,
                                text(fields, "number", issues),
                                text(fields, "revision", issues),
                                text(fields, "prepared_by", issues))));
  }

  private static String text(Fields fields, String key, Issues issues) {
    return fields.find(key).flatMap(value -> Texts.sentence(value, issues)).orElse("");
  }
}
