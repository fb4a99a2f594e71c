package org.foreseal.report;

import com.fasterxml.jackson.databind.JsonNode;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.foreseal.quantity.CsvTable;

/** Checks JSON and YAML trees against the schemas shipped in the jar. */
public final class SchemaCheck {
  private final Schema schema;

  private SchemaCheck(Schema schema) {
    this.schema = schema;
  }

  /** A schema of the resource folder {@code schemas}. */
  public static SchemaCheck load(String name) {
    String text = new String(CsvTable.bytes("/schemas/" + name), StandardCharsets.UTF_8);
    return new SchemaCheck(
        SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
            .getSchema(text, InputFormat.JSON));
  }

  /** What does not fit, with its place; empty when all fits. */
  public List<String> faults(JsonNode instance) {
    return schema.validate(instance).stream().map(Object::toString).toList();
  }
}
