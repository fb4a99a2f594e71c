package org.foreseal.thermo;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Formula;
import org.foreseal.molecule.Molecule;

/**
 * Atoms of the elements that gas-phase species here are made of.
 *
 * @param carbon C atoms
 * @param hydrogen H atoms
 * @param nitrogen N atoms
 * @param oxygen O atoms
 * @param sulfur S atoms
 */
record ElementCounts(int carbon, int hydrogen, int nitrogen, int oxygen, int sulfur) {
  static final ElementCounts NONE = new ElementCounts(0, 0, 0, 0, 0);

  static ElementCounts of(Molecule molecule) {
    Formula f = molecule.formula();
    return new ElementCounts(
        f.count(ChemicalElement.C),
        f.count(ChemicalElement.H),
        f.count(ChemicalElement.N),
        f.count(ChemicalElement.O),
        f.count(ChemicalElement.S));
  }

  ElementCounts plus(ElementCounts other, int times) {
    return new ElementCounts(
        carbon + times * other.carbon,
        hydrogen + times * other.hydrogen,
        nitrogen + times * other.nitrogen,
        oxygen + times * other.oxygen,
        sulfur + times * other.sulfur);
  }

  /** Sum over the reference states (C, H2, N2, O2, S) of moles times a value per mole. */
  double sum(ToDoubleFunction<String> valuePerMole) {
    double sum = 0;
    for (String reference : references()) {
      sum += moles(reference) * valuePerMole.applyAsDouble(reference);
    }
    return sum;
  }

  /** Reference states that occur. */
  List<String> references() {
    List<String> all = new ArrayList<>(List.of("C", "H2", "N2", "O2", "S"));
    all.removeIf(r -> moles(r) == 0);
    return all;
  }

  private double moles(String reference) {
    return switch (reference) {
      case "C" -> carbon;
      case "H2" -> hydrogen / 2.0;
      case "N2" -> nitrogen / 2.0;
      case "O2" -> oxygen / 2.0;
      default -> sulfur;
    };
  }
}
