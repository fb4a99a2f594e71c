package org.foreseal.molecule;

import java.util.Collections;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.Map;

/**
 * Elements and their counts, with the net charge. Written in the Hill order: C, H, then the others
 * by symbol.
 *
 * @param counts atoms of each element, none of them zero
 * @param charge net charge
 */
public record Formula(Map<ChemicalElement, Integer> counts, int charge) {
  /** Keeps an unmodifiable copy. */
  public Formula {
    counts = Collections.unmodifiableMap(new EnumMap<>(counts));
  }

  static Formula of(Molecule molecule) {
    Map<ChemicalElement, Integer> counts = new EnumMap<>(ChemicalElement.class);
    for (int i = 0; i < molecule.atomCount(); i++) {
      counts.merge(ChemicalElement.require(molecule.element(i)), 1, Integer::sum);
      if (molecule.hydrogens(i) > 0) {
        counts.merge(ChemicalElement.H, molecule.hydrogens(i), Integer::sum);
      }
    }
    return new Formula(counts, molecule.netCharge());
  }

  /** Atoms of this element. */
  public int count(ChemicalElement element) {
    return counts.getOrDefault(element, 0);
  }

  /**
   * Mass of the isotopologue with the most abundant isotope of every element, Da; electron masses
   * are left out.
   */
  public double monoisotopicMassDalton() {
    return counts.entrySet().stream()
        .mapToDouble(e -> e.getValue() * e.getKey().monoisotopicMassDalton())
        .sum();
  }

  @Override
  public String toString() {
    StringBuilder text = new StringBuilder();
    boolean organic = counts.containsKey(ChemicalElement.C);
    if (organic) {
      append(text, ChemicalElement.C);
      append(text, ChemicalElement.H);
    }
    counts.keySet().stream()
        .filter(e -> !organic || (e != ChemicalElement.C && e != ChemicalElement.H))
        .sorted(Comparator.comparing(ChemicalElement::symbol))
        .forEach(e -> append(text, e));
    if (charge != 0) {
      text.append(charge > 0 ? "+" : "-")
          .append(Math.abs(charge) == 1 ? "" : Integer.toString(Math.abs(charge)));
    }
    return text.toString();
  }

  private void append(StringBuilder text, ChemicalElement e) {
    int n = count(e);
    if (n > 0) {
      text.append(e.symbol());
      if (n > 1) {
        text.append(n);
      }
    }
  }
}
