/**
 * Molecules: the graph, its identity and its names. A {@link org.foreseal.molecule.Molecule} is
 * immutable and stored in canonical atom order, so equal structures are equal objects whatever
 * order their atoms came in. The cheminformatics library is met only here (reading and writing
 * SMILES, InChIKey); everything else works on the small graph of this package.
 */
@NullMarked
package org.foreseal.molecule;

import org.jspecify.annotations.NullMarked;
