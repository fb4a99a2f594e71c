package org.foreseal.molecule;

import java.util.List;

/**
 * A ring parent of nomenclature.
 *
 * @param kind how suffixes are added to it
 * @param name its name; for a carbocycle "cyclo" and the stem
 * @param structure its structure
 * @param order canonical position in the structure of each atom in the order of the locants
 * @param locants locant of each of these atoms, "-" for an atom that takes no substituent
 */
record RingParent(
    Kind kind, String name, Molecule structure, List<Integer> order, List<String> locants) {
  RingParent {
    order = List.copyOf(order);
    locants = List.copyOf(locants);
  }

  /** How suffixes are added. */
  enum Kind {
    /** Phenol, aniline, benzoic acid. */
    BENZENE,
    /** Cyclohexanone, 2-cyclohexen-1-ol. */
    CARBOCYCLE,
    /** Naphthalen-1-ol. */
    OTHER,
    /** 1-Indanone: the suffix is in the name. */
    FIXED
  }

  static RingParent carbocycle(int size) {
    List<Integer> places = java.util.stream.IntStream.range(0, size).boxed().toList();
    List<String> locants = places.stream().map(i -> Integer.toString(i + 1)).toList();
    return new RingParent(
        Kind.CARBOCYCLE,
        "cyclo" + NameParts.stem(size),
        Smiles.read("C1" + "C".repeat(size - 1) + "1"),
        places,
        locants);
  }

  /** The name without the last e. */
  String stem() {
    return name.endsWith("e") ? name.substring(0, name.length() - 1) : name;
  }
}
