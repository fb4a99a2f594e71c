package org.foreseal.cli;

import java.io.InputStream;
import java.util.function.Function;
import java.util.function.LongSupplier;
import java.util.function.Supplier;
import org.foreseal.molecule.Molecule;
import org.foreseal.run.Engine;
import org.foreseal.run.StructureReader;

/**
 * What the commands work with. Tests put their own in.
 *
 * @param engine the calculations, made on first use because loading the rules takes time
 * @param structures reads names and SMILES
 * @param names what a chemist would call a molecule
 * @param input standard input, for {@code -}
 * @param isTerminal whether a person watches standard error
 * @param nanoTime a clock, ns
 */
record Session(
    Supplier<Engine> engine,
    StructureReader structures,
    Function<Molecule, String> names,
    InputStream input,
    boolean isTerminal,
    LongSupplier nanoTime) {}
