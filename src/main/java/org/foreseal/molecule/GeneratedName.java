package org.foreseal.molecule;

import java.util.Optional;

/** Builds systematic names of simple families. */
final class GeneratedName {
  private GeneratedName() {}

  static Optional<String> of(Molecule molecule) {
    return Optional.empty();
  }
}
