package org.foreseal.network;

import java.util.BitSet;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.foreseal.molecule.Molecule;
import org.foreseal.rule.AmbientSpecies;

/**
 * The state of the network that all rules see while one depth is expanded.
 *
 * <p>New molecules are shared between the rules through {@link #shared(Molecule)}, so that each is
 * kept in memory once.
 */
final class DepthView {
  private final List<Species> species;
  private final int firstNew;
  private final Map<Molecule, Integer> ids;
  private final StepPruner pruner;
  private final long deadline;
  private final BitSet ambient = new BitSet();
  private final Map<Molecule, Molecule> fresh = new ConcurrentHashMap<>();

  DepthView(
      List<Species> species,
      int firstNew,
      Map<Molecule, Integer> ids,
      StepPruner pruner,
      long deadline) {
    this.species = species;
    this.firstNew = firstNew;
    this.ids = ids;
    this.pruner = pruner;
    this.deadline = deadline;
    species.stream()
        .filter(s -> AmbientSpecies.includes(s.molecule()))
        .forEach(s -> ambient.set(s.id()));
  }

  int size() {
    return species.size();
  }

  /** Id of the first species of the last depth. */
  int firstNew() {
    return firstNew;
  }

  Species species(int id) {
    return species.get(id);
  }

  /** Whether this is one of the small molecules that are always about. */
  boolean isAmbient(int id) {
    return ambient.get(id);
  }

  StepPruner pruner() {
    return pruner;
  }

  boolean isOutOfTime() {
    return System.nanoTime() - deadline > 0;
  }

  Molecule shared(Molecule molecule) {
    Integer id = ids.get(molecule);
    if (id != null && id < species.size()) {
      return species.get(id).molecule();
    }
    Molecule earlier = fresh.putIfAbsent(molecule, molecule);
    return earlier == null ? molecule : earlier;
  }
}
