package org.foreseal.thermo;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.quantity.CsvTable;
import org.foreseal.quantity.Uncertain;

/** Molecules read from a table, with its sources: resource {@code thermo/small-molecules.csv}. */
final class SmallMolecules {
  private final Map<Molecule, Species> species = new HashMap<>();

  private SmallMolecules(CsvTable table, ElementReference elements) {
    for (int row = 0; row < table.size(); row++) {
      Molecule molecule = Smiles.read(table.text(row, "smiles"));
      ElementCounts counts = ElementCounts.of(molecule);
      species.put(
          molecule,
          new Species(
              thermochemistry(table, row, elements.entropy298(counts)), TermVector.NONE, counts));
    }
  }

  static SmallMolecules read(ElementReference elements) {
    return new SmallMolecules(CsvTable.read("/thermo/small-molecules.csv"), elements);
  }

  private static Thermochemistry thermochemistry(CsvTable table, int row, double elementEntropy) {
    double enthalpySd = table.number(row, "enthalpy_sd");
    double entropySd = table.number(row, "entropy_sd");
    return new Thermochemistry(
        new Uncertain(table.number(row, "enthalpy"), enthalpySd),
        new Uncertain(table.number(row, "entropy"), entropySd),
        HeatCapacity.of(table, row),
        1,
        1,
        Origin.TABULATED,
        List.of(),
        new GibbsSpread(0, enthalpySd * enthalpySd, entropySd * entropySd, 1, 1),
        elementEntropy);
  }

  Optional<Species> find(Molecule molecule) {
    return Optional.ofNullable(species.get(molecule));
  }
}
