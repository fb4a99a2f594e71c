package org.foreseal.thermo;

import java.util.Optional;
import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Molecule;

/**
 * Tells whether a molecule has only atoms and double bonds the group method has types for. Nitrogen
 * doubly bonded to N or O, and sulfur doubly bonded to N or S, never occurred in the fit in any
 * useful number and are refused rather than mistaken for imines and sulfoxides; aromatic N=N, as in
 * pyridazine, has groups of its own.
 */
final class TypeCheck {
  private static final int CARBON = ChemicalElement.C.atomicNumber();
  private static final int NITROGEN = ChemicalElement.N.atomicNumber();
  private static final int OXYGEN = ChemicalElement.O.atomicNumber();
  private static final int SULFUR = ChemicalElement.S.atomicNumber();

  private TypeCheck() {}

  /** Why a molecule cannot be estimated from groups, empty when it can be tried. */
  static Optional<String> obstacle(Molecule m) {
    for (int i = 0; i < m.atomCount(); i++) {
      int e = m.element(i);
      if (m.charge(i) != 0) {
        return Optional.of("the gas-phase groups have no charged atoms");
      }
      if (e != CARBON && e != NITROGEN && e != OXYGEN && e != SULFUR) {
        return Optional.of("the gas-phase groups know only C, H, N, O and S");
      }
      if (hasUnknownMultipleBond(m, i)) {
        return Optional.of(
            "the gas-phase groups have no type for this multiple bond of "
                + (e == NITROGEN ? "nitrogen" : "sulfur"));
      }
    }
    return m.heavyAtomCount() < 2
        ? Optional.of("no tabulated gas-phase values for this small molecule")
        : Optional.empty();
  }

  private static boolean hasUnknownMultipleBond(Molecule m, int atom) {
    int e = m.element(atom);
    boolean toCarbon = false;
    boolean toOther = false;
    for (int k = 0; k < m.degree(atom); k++) {
      if (m.order(atom, k) > 1) {
        int other = m.element(m.neighbour(atom, k));
        toCarbon |= other == CARBON;
        toOther |= other != CARBON && !(e == SULFUR && other == OXYGEN);
        toOther |= e == SULFUR && m.order(atom, k) > 2;
      }
    }
    boolean mixed = e == SULFUR && toCarbon && m.degree(atom) > 1;
    return (e == NITROGEN || e == SULFUR) && !m.isAromatic(atom) && (toOther || mixed);
  }
}
