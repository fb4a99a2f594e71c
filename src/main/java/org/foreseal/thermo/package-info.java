/**
 * Gas-phase thermochemistry of molecules and of steps between them. The entry type is {@link
 * org.foreseal.thermo.GasPhase}: enthalpy, entropy, heat capacity and Gibbs energy of a molecule
 * from fitted group terms or a table, and the Gibbs energy of a balanced step with a standard
 * deviation that knows which terms its two sides share.
 *
 * <p>Units throughout: kJ/mol for enthalpies and Gibbs energies, J/(mol K) for entropies and heat
 * capacities, K for temperatures; ideal gas at 1 bar. Parameters and their sources are in the
 * resource folder {@code thermo}.
 */
@NullMarked
package org.foreseal.thermo;

import org.jspecify.annotations.NullMarked;
