package org.foreseal.thermo;

import java.util.List;
import org.foreseal.quantity.CsvTable;

/** Reads the check values of this room. */
final class TestTables {
  private TestTables() {}

  static List<List<String>> rows(String name) {
    return CsvTable.read("/thermo/" + name).rows();
  }
}
