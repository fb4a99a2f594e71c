package org.foreseal.network;

import org.foreseal.molecule.Molecule;

/**
 * One species of a network.
 *
 * @param id number in the network, from 0, in order of depth
 * @param molecule structure
 * @param depth fewest steps from the charge
 */
public record Species(int id, Molecule molecule, int depth) {}
