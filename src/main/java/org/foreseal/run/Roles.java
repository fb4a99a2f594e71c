package org.foreseal.run;

import java.util.Arrays;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.foreseal.rule.Provision;

/** The roles a solid or additive can have, as words and as read off a structure. */
final class Roles {
  private static final int NITROGEN = 7;
  private static final int OXYGEN = 8;
  private static final Set<Integer> OXYACID_CENTRES = Set.of(6, 15, 16);
  private static final Set<Integer> HALOGENS = Set.of(9, 17, 35, 53);

  /** What only the medium and the temperature give. */
  private static final Set<Provision> NOT_FROM_A_MATERIAL =
      EnumSet.of(Provision.WATER, Provision.HOMOLYSIS);

  private Roles() {}

  /** The words of a run sheet, in the order of the enumeration. */
  static List<String> words() {
    return Arrays.stream(Provision.values())
        .filter(p -> !NOT_FROM_A_MATERIAL.contains(p))
        .map(Provision::word)
        .toList();
  }

  static Optional<Provision> find(String word) {
    return Provision.of(word).filter(p -> !NOT_FROM_A_MATERIAL.contains(p));
  }

  static Provision read(String word, Place place) {
    return find(word)
        .orElseThrow(
            () ->
                new BadInputException(
                    place, "no role is called " + word.strip(), Nearest.hint(word, words())));
  }

  /**
   * Acid for carboxylic, sulfonic, mineral oxyacids and hydrogen halides; base for amines and
   * pyridines. Common practice.
   */
  static Set<Provision> of(Molecule molecule) {
    EnumSet<Provision> roles = EnumSet.noneOf(Provision.class);
    for (int atom = 0; atom < molecule.atomCount(); atom++) {
      if (isAcidic(molecule, atom)) {
        roles.add(Provision.ACID);
      }
      if (isBasicNitrogen(molecule, atom)) {
        roles.add(Provision.BASE);
      }
    }
    return roles;
  }

  private static boolean isAcidic(Molecule m, int atom) {
    if (HALOGENS.contains(m.element(atom))) {
      return m.hydrogens(atom) == 1;
    }
    if (!OXYACID_CENTRES.contains(m.element(atom))) {
      return false;
    }
    boolean hasOxo = false;
    boolean hasHydroxyl = false;
    for (int slot = 0; slot < m.degree(atom); slot++) {
      int other = m.neighbour(atom, slot);
      boolean isTerminalOxygen = m.element(other) == OXYGEN && m.degree(other) == 1;
      hasOxo |= isTerminalOxygen && m.order(atom, slot) == 2;
      hasHydroxyl |= isTerminalOxygen && m.hydrogens(other) == 1;
    }
    return hasOxo && hasHydroxyl;
  }

  private static boolean isBasicNitrogen(Molecule m, int atom) {
    if (m.element(atom) != NITROGEN || m.charge(atom) != 0) {
      return false;
    }
    if (m.isAromatic(atom)) {
      return m.degree(atom) == 2 && m.hydrogens(atom) == 0;
    }
    for (int slot = 0; slot < m.degree(atom); slot++) {
      int other = m.neighbour(atom, slot);
      if (m.order(atom, slot) > 1 || m.element(other) != 6 || isAcyl(m, other)) {
        return false;
      }
    }
    return true;
  }

  private static boolean isAcyl(Molecule m, int carbon) {
    for (int slot = 0; slot < m.degree(carbon); slot++) {
      if (m.order(carbon, slot) > 1
          && !m.isAromaticBond(carbon, slot)
          && m.element(m.neighbour(carbon, slot)) != 6) {
        return true;
      }
    }
    return false;
  }
}
