package org.foreseal.molecule;

import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.silent.SilentChemObjectBuilder;

/** Carries structures between the cheminformatics library and this package. */
final class CdkBridge {
  private CdkBridge() {}

  static IAtomContainer toLibrary(Molecule m) {
    IAtomContainer container = SilentChemObjectBuilder.getInstance().newAtomContainer();
    for (int i = 0; i < m.atomCount(); i++) {
      IAtom atom = container.getBuilder().newAtom();
      atom.setAtomicNumber(m.element(i));
      atom.setFormalCharge(m.charge(i));
      atom.setImplicitHydrogenCount(m.hydrogens(i));
      atom.setIsAromatic(m.isAromatic(i));
      container.addAtom(atom);
    }
    for (int i = 0; i < m.atomCount(); i++) {
      for (int k = 0; k < m.degree(i); k++) {
        if (m.neighbour(i, k) > i) {
          container.addBond(i, m.neighbour(i, k), libraryOrder(m.order(i, k)));
          container.getBond(container.getBondCount() - 1).setIsAromatic(m.isAromaticBond(i, k));
        }
      }
    }
    return container;
  }

  private static IBond.Order libraryOrder(int order) {
    return switch (order) {
      case 1 -> IBond.Order.SINGLE;
      case 2 -> IBond.Order.DOUBLE;
      default -> IBond.Order.TRIPLE;
    };
  }

  /**
   * Explicit hydrogens become counts on their neighbour; H2 becomes one hydrogen atom that carries
   * one.
   */
  static MoleculeBuilder fromLibrary(IAtomContainer container) {
    MoleculeBuilder builder = new MoleculeBuilder();
    int[] index = new int[container.getAtomCount()];
    for (int i = 0; i < index.length; i++) {
      IAtom atom = container.getAtom(i);
      boolean absorbed = isAbsorbed(atom);
      index[i] =
          absorbed ? -1 : builder.addAtom(atom.getAtomicNumber(), charge(atom), hydrogens(atom));
    }
    for (IBond bond : container.bonds()) {
      int a = index[bond.getBegin().getIndex()];
      int b = index[bond.getEnd().getIndex()];
      if (a < 0 || b < 0) {
        builder.changeHydrogens(Math.max(a, b), 1);
      } else {
        builder.setOrder(a, b, bond.getOrder().numeric());
      }
    }
    return builder;
  }

  private static boolean isAbsorbed(IAtom atom) {
    if (atom.getAtomicNumber() != 1 || atom.getBondCount() != 1 || charge(atom) != 0) {
      return false;
    }
    IAtom other = atom.bonds().iterator().next().getOther(atom);
    return other.getAtomicNumber() != 1
        || other.getBondCount() > 1
        || atom.getIndex() > other.getIndex();
  }

  private static int charge(IAtom atom) {
    return atom.getFormalCharge() == null ? 0 : atom.getFormalCharge();
  }

  private static int hydrogens(IAtom atom) {
    return atom.getImplicitHydrogenCount() == null ? 0 : atom.getImplicitHydrogenCount();
  }
}
