package org.foreseal.network;

import java.time.Duration;

/**
 * Where an expansion ends at the latest.
 *
 * @param depth steps from the charge
 * @param species most species
 * @param heavyAtoms largest molecule, atoms other than hydrogen
 * @param carbons largest molecule, carbon atoms
 * @param pairsPerRule most combinations of reactants tried per rule and depth
 * @param wallTime longest time
 * @param threads threads to use; the result does not depend on it
 */
public record Limits(
    int depth,
    int species,
    int heavyAtoms,
    int carbons,
    int pairsPerRule,
    Duration wallTime,
    int threads) {
  /** Generous limits for an everyday forecast of this depth. */
  public static Limits ofDepth(int depth) {
    return new Limits(
        depth,
        100_000,
        40,
        40,
        200_000,
        Duration.ofMinutes(5),
        Runtime.getRuntime().availableProcessors());
  }

  /** Refuses what makes no sense. */
  public Limits {
    if (depth < 0
        || species < 1
        || heavyAtoms < 1
        || carbons < 0
        || pairsPerRule < 1
        || threads < 1) {
      throw new IllegalArgumentException("a limit is not positive");
    }
  }

  /** The same with another number of threads. */
  public Limits withThreads(int other) {
    return new Limits(depth, species, heavyAtoms, carbons, pairsPerRule, wallTime, other);
  }

  /** The same with another cap on the species. */
  public Limits withSpecies(int other) {
    return new Limits(depth, other, heavyAtoms, carbons, pairsPerRule, wallTime, threads);
  }
}
