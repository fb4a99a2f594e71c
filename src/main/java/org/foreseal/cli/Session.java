package org.foreseal.cli;

import java.io.InputStream;
import java.util.function.LongSupplier;
import java.util.function.Supplier;
import org.foreseal.molecule.MoleculeNames;
import org.foreseal.molecule.MoleculeReader;
import org.foreseal.run.Engine;

/**
 * What the commands work with. Tests put their own in.
 *
 * @param engine the calculations, made on first use because loading the rules takes time
 * @param molecules reads names and SMILES
 * @param names what a chemist would call a molecule
 * @param input standard input, for {@code -}
 * @param isTerminal whether a person watches standard error
 * @param nanoTime a clock, ns
 */
record Session(
    Supplier<Engine> engine,
    MoleculeReader molecules,
    MoleculeNames names,
    InputStream input,
    boolean isTerminal,
    LongSupplier nanoTime) {}
