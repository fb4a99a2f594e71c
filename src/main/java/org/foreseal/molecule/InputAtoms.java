package org.foreseal.molecule;

import java.util.Set;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.openscience.cdk.graph.Cycles;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;

/** Looks at the atoms of an input structure before it becomes a molecule, and refuses strangers. */
final class InputAtoms {
  private static final Set<Integer> NON_METALS =
      Set.of(
          1, 2, 5, 6, 7, 8, 9, 10, 14, 15, 16, 17, 18, 32, 33, 34, 35, 36, 51, 52, 53, 54, 85, 86);

  private final IAtomContainer container;
  private final int[] offsets;
  private final Place start;

  /**
   * The atoms of a parsed structure.
   *
   * @param offsets where in the text each atom stands; empty when it came from a name
   * @param start place of the first character of the text
   */
  InputAtoms(IAtomContainer container, int[] offsets, Place start) {
    this.container = container;
    this.offsets = offsets;
    this.start = start;
  }

  /** Refuses unknown atoms and isotopes. */
  void checkKinds() {
    for (IAtom atom : container.atoms()) {
      checkKind(atom);
    }
  }

  /** Refuses foreign elements, bound metals, stray small letters, radicals, too many bonds. */
  void checkBonds() {
    Cycles.markRingAtomsAndBonds(container);
    for (IAtom atom : container.atoms()) {
      if (!isMetalIon(atom)) {
        checkElement(atom);
        checkRing(atom);
        checkValence(atom);
      }
    }
  }

  static boolean isMetalIon(IAtom atom) {
    return isMetal(atom) && atom.getBondCount() == 0 && charge(atom) > 0;
  }

  private static boolean isMetal(IAtom atom) {
    return !NON_METALS.contains(atom.getAtomicNumber());
  }

  private void checkKind(IAtom atom) {
    if (atom.getAtomicNumber() == null || atom.getAtomicNumber() == 0) {
      throw bad(atom, "an atom that stands for anything", "write the atom that is there");
    }
    if (atom.getMassNumber() != null) {
      throw bad(
          atom,
          "an isotope of " + atom.getSymbol(),
          "give the molecule without isotopes; labels come with the label command");
    }
  }

  private void checkElement(IAtom atom) {
    if (isMetal(atom)) {
      throw bad(
          atom,
          "the metal " + atom.getSymbol() + " in a molecule",
          "give a metal or mineral as a solid; write a salt as ions, [Na+].[O-]C(C)=O");
    }
    boolean known =
        ChemicalElement.of(atom.getAtomicNumber())
            .map(ChemicalElement::isAllowedInInput)
            .orElse(false);
    if (!known) {
      throw bad(
          atom,
          "the element " + atom.getSymbol() + " is outside this program",
          "it knows C H N O S P F Cl Br I");
    }
  }

  private void checkRing(IAtom atom) {
    if (atom.isAromatic() && !atom.isInRing()) {
      throw bad(
          atom,
          "an aromatic atom outside a ring",
          "small letters are for aromatic rings: write " + atom.getSymbol());
    }
  }

  private void checkValence(IAtom atom) {
    int bonds = hydrogens(atom);
    for (IBond bond : atom.bonds()) {
      bonds += bond.getOrder().numeric();
    }
    ChemicalElement e = ChemicalElement.require(atom.getAtomicNumber());
    if (charge(atom) != 0 || e.allowsValence(0, bonds)) {
      return;
    }
    if (!lacksBonds(e, bonds)) {
      throw bad(
          atom,
          "not a molecule: " + e.symbol() + " cannot carry " + bonds + " bonds",
          "check the valences of this atom");
    }
    throw bad(
        atom,
        e.symbol() + " with " + bonds + (bonds == 1 ? " bond" : " bonds") + " is a radical",
        e == ChemicalElement.C && bonds == 2
            ? "carbon monoxide is [C-]#[O+]; otherwise give every carbon four bonds"
            : "give the closed-shell molecule; atoms in brackets need their hydrogens written");
  }

  private static boolean lacksBonds(ChemicalElement e, int bonds) {
    for (int more = bonds + 1; more <= bonds + 4; more++) {
      if (e.allowsValence(0, more)) {
        return true;
      }
    }
    return false;
  }

  BadInputException bad(IAtom atom, String problem, String hint) {
    int offset = atom.getIndex() < offsets.length ? offsets[atom.getIndex()] : 0;
    return new BadInputException(shifted(start, offset), problem, hint);
  }

  static Place shifted(Place start, int offset) {
    int column = Math.max(1, start.column()) + offset;
    return new Place(start.source(), start.line(), column, start.text());
  }

  static int charge(IAtom atom) {
    return atom.getFormalCharge() == null ? 0 : atom.getFormalCharge();
  }

  static int hydrogens(IAtom atom) {
    return atom.getImplicitHydrogenCount() == null ? 0 : atom.getImplicitHydrogenCount();
  }
}
