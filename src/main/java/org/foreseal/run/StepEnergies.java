package org.foreseal.run;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.foreseal.molecule.Molecule;
import org.foreseal.quantity.Uncertain;

/** Gibbs energies of steps at the temperature of a run. Called from several threads. */
@FunctionalInterface
interface StepEnergies {
  /** Standard Gibbs energy of a balanced step, kJ/mol, or nothing where it cannot be estimated. */
  Optional<Uncertain> deltaGibbs(List<Molecule> reactants, List<Molecule> products);

  /** The value alone, for a first look; quicker where the error takes time. */
  default OptionalDouble deltaGibbsValue(List<Molecule> reactants, List<Molecule> products) {
    return deltaGibbs(reactants, products).stream().mapToDouble(Uncertain::value).findFirst();
  }

  /**
   * What is weak about the estimate for a molecule.
   *
   * @param kind in words
   * @param terms names of the terms at fault, may be empty
   */
  record Weakness(String kind, List<String> terms) {
    /** Keeps an unmodifiable copy. */
    public Weakness {
      terms = List.copyOf(terms);
    }
  }

  /** What is weak about the estimate for a molecule; nothing when it is sound. */
  default Optional<Weakness> weakness(Molecule molecule) {
    return Optional.empty();
  }
}
