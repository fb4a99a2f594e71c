package org.foreseal.molecule;

/**
 * One connected molecule made by a {@link MoleculeBuilder}, with the way back to the builder's
 * atoms.
 */
public final class Fragment {
  private final Molecule molecule;
  private final int[] builderAtoms;

  Fragment(Molecule molecule, int[] builderAtoms) {
    this.molecule = molecule;
    this.builderAtoms = builderAtoms;
  }

  /** The molecule, atoms in canonical order. */
  public Molecule molecule() {
    return molecule;
  }

  /** The builder's index of the atom at this canonical position. */
  public int builderAtom(int position) {
    return builderAtoms[position];
  }
}
