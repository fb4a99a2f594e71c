package org.foreseal.rule;

import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.foreseal.quantity.CsvTable;
import org.foreseal.yaml.YamlValue;

/** The references that rules and tables cite by key, in resource {@code references.yaml}. */
public final class Bibliography {
  private static final Set<String> KEYS =
      Set.of("key", "journal", "year", "volume", "pages", "doi", "title", "read", "note");

  private final Map<String, String> references;

  private Bibliography(Map<String, String> references) {
    this.references = references;
  }

  /** The shipped list. */
  public static Bibliography builtIn() {
    String yaml = new String(CsvTable.bytes("/references.yaml"), StandardCharsets.UTF_8);
    Map<String, String> references = new LinkedHashMap<>();
    for (YamlValue entry : YamlValue.parse("references.yaml", yaml).items()) {
      entry.mapOf(KEYS);
      references.put(entry.require("key").text(), words(entry));
    }
    return new Bibliography(references);
  }

  /**
   * Journal, year, volume, pages and DOI, or the title where there is no journal; a note says what
   * was not recorded or is from memory.
   */
  private static String words(YamlValue entry) {
    String place =
        Stream.of("journal", "year", "volume", "pages")
            .map(key -> entry.textOr(key, ""))
            .filter(text -> !text.isEmpty())
            .collect(Collectors.joining(", "));
    String doi = entry.get("doi").map(d -> "doi " + d.text()).orElse("");
    String title = entry.has("journal") ? "" : entry.textOr("title", "");
    String note = entry.get("note").map(n -> " (" + n.text() + ")").orElse("");
    return Stream.of(title, place, doi)
            .filter(text -> !text.isEmpty())
            .collect(Collectors.joining(", "))
        + note;
  }

  /** All keys. */
  public List<String> keys() {
    return List.copyOf(references.keySet());
  }

  /** The reference in words, if the key is known. */
  public Optional<String> find(String key) {
    return Optional.ofNullable(references.get(key));
  }
}
