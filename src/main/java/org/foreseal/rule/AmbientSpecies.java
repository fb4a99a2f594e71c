package org.foreseal.rule;

import java.util.List;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;

/**
 * The small molecules that are about in every run without being its subject. Guards that speak of
 * reaction partners do not count them.
 */
public final class AmbientSpecies {
  /** Water. */
  public static final Molecule WATER = Smiles.read("O");

  /** Dihydrogen. */
  public static final Molecule HYDROGEN = Smiles.read("[H][H]");

  /** Carbon dioxide. */
  public static final Molecule CARBON_DIOXIDE = Smiles.read("O=C=O");

  /** Carbon monoxide. */
  public static final Molecule CARBON_MONOXIDE = Smiles.read("[C-]#[O+]");

  /** Ammonia. */
  public static final Molecule AMMONIA = Smiles.read("N");

  /** Hydrogen sulfide. */
  public static final Molecule HYDROGEN_SULFIDE = Smiles.read("S");

  /** Dioxygen. */
  public static final Molecule OXYGEN = Smiles.read("O=O");

  private static final Set<Molecule> ALL =
      Set.copyOf(
          List.of(
              WATER, HYDROGEN, CARBON_DIOXIDE, CARBON_MONOXIDE, AMMONIA, HYDROGEN_SULFIDE, OXYGEN));

  private AmbientSpecies() {}

  /** Whether this is one of them. */
  public static boolean includes(Molecule molecule) {
    return ALL.contains(molecule);
  }
}
