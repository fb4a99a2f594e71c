package org.foreseal.molecule;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.foreseal.quantity.CsvTable;

/**
 * Formulas of small species that are accepted as input ({@code names/formulas.csv}). Several are
 * also valid SMILES of something else: CO is methanol, NO hydroxylamine. SMILES wins, with a note.
 */
final class SmallFormulas {
  /**
   * One formula.
   *
   * @param smiles its structure, empty where the species is no molecule of this project
   * @param meaning its name
   */
  record Entry(String smiles, String meaning) {}

  private final Map<String, Entry> entries = new LinkedHashMap<>();

  SmallFormulas() {
    for (List<String> row : CsvTable.read("/names/formulas.csv").rows()) {
      entries.put(row.get(0), new Entry(row.get(1), row.get(2)));
    }
  }

  Optional<Entry> find(String text) {
    return Optional.ofNullable(entries.get(text));
  }
}
