/**
 * Molecules: the graph, its identity and its names. A {@link org.foreseal.molecule.Molecule} is
 * immutable and stored in canonical atom order, so equal structures are equal objects whatever
 * order their atoms came in. The cheminformatics library is met only here (reading and writing
 * SMILES, InChIKey); everything else works on the small graph of this package.
 *
 * <p>Normalisation happens in two places. {@link org.foreseal.molecule.MoleculeBuilder} makes every
 * structure canonical: aromatic rings localised one way, enols as carbonyl compounds. {@link
 * org.foreseal.molecule.MoleculeReader} makes what a user wrote a species of the forecast: neutral,
 * flat, without counter-ions and water of crystallisation, each change with a note. Names come from
 * {@link org.foreseal.molecule.MoleculeNames} and stand for the flat species.
 */
@NullMarked
package org.foreseal.molecule;

import org.jspecify.annotations.NullMarked;
