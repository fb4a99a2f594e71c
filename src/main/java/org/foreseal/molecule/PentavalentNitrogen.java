package org.foreseal.molecule;

import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;

/** Nitrogen drawn with five bonds, as in N(=O)=O or N=N#N, is rewritten charge-separated. */
final class PentavalentNitrogen {
  private static final int OXYGEN = 8;
  private static final int NITROGEN = 7;

  private PentavalentNitrogen() {}

  /** Rewrites in place; true when anything was. */
  static boolean rewrite(IAtomContainer container) {
    boolean any = false;
    for (IAtom atom : container.atoms()) {
      if (atom.getAtomicNumber() == NITROGEN && InputAtoms.charge(atom) == 0 && bonds(atom) == 5) {
        any |=
            separate(atom, OXYGEN, IBond.Order.DOUBLE, IBond.Order.SINGLE)
                || separate(atom, NITROGEN, IBond.Order.TRIPLE, IBond.Order.DOUBLE);
      }
    }
    return any;
  }

  private static int bonds(IAtom atom) {
    int total = InputAtoms.hydrogens(atom);
    for (IBond bond : atom.bonds()) {
      total += bond.getOrder().numeric();
    }
    return total;
  }

  private static boolean separate(IAtom atom, int element, IBond.Order from, IBond.Order to) {
    for (IBond bond : atom.bonds()) {
      IAtom other = bond.getOther(atom);
      if (bond.getOrder() == from
          && other.getAtomicNumber() == element
          && other.getBondCount() == 1
          && InputAtoms.charge(other) == 0) {
        bond.setOrder(to);
        atom.setFormalCharge(1);
        other.setFormalCharge(-1);
        return true;
      }
    }
    return false;
  }
}
