package org.foreseal.molecule;

/**
 * A condition on one atom of a molecule. Hydrogens are counts in the graph, so an atom is given as
 * a code: its index, or {@code ~index} for one hydrogen on the atom of that index.
 */
@FunctionalInterface
interface AtomTest {
  boolean accepts(Molecule molecule, int code);
}
