package org.gasmargin.job;

import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import org.jspecify.annotations.Nullable;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.schema.CoreSchema;
import tools.jackson.databind.json.JsonMapper;

/** The published JSON Schema, applied by a validator that knows nothing of the reader. */
final class JobSchema {
  private static final Schema SCHEMA =
      SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
          .getSchema(Jobs.text("/schema/job.schema.json"));
  private static final JsonMapper MAPPER = new JsonMapper();

  private JobSchema() {}

  /** Whether a text is YAML 1.2 with unique keys and no tags or aliases that the schema allows. */
  static boolean accepts(String text) {
    LoadSettings settings =
        LoadSettings.builder()
            .setSchema(new CoreSchema())
            .setAllowDuplicateKeys(false)
            .setMaxAliasesForCollections(0)
            .build();
    try {
      return acceptsTree(new Load(settings).loadFromString(text));
    } catch (YamlEngineException e) {
      return false;
    }
  }

  static boolean acceptsTree(@Nullable Object tree) {
    return SCHEMA.validate(MAPPER.valueToTree(tree)).isEmpty();
  }
}
