package org.foreseal.molecule;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** Reads the small tables in the jar: comma-separated, a field with commas stands in quotes. */
final class CsvTable {
  private CsvTable() {}

  /** The rows below the heading, each with as many fields as the heading. */
  static List<List<String>> read(String resource) {
    try (InputStream in = CsvTable.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalStateException("missing from the program: " + resource);
      }
      BufferedReader reader = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8));
      List<List<String>> rows = new ArrayList<>();
      reader.lines().skip(1).filter(line -> !line.isBlank()).forEach(line -> rows.add(split(line)));
      return rows;
    } catch (IOException e) {
      throw new UncheckedIOException(resource, e);
    }
  }

  private static List<String> split(String line) {
    List<String> fields = new ArrayList<>();
    StringBuilder field = new StringBuilder();
    boolean quoted = false;
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      if (c == '"') {
        quoted = !quoted;
      } else if (c == ',' && !quoted) {
        fields.add(field.toString());
        field.setLength(0);
      } else {
        field.append(c);
      }
    }
    fields.add(field.toString());
    return List.copyOf(fields);
  }
}
