package org.foreseal.plan;

import java.util.List;
import java.util.Optional;
import org.foreseal.molecule.Molecule;

/**
 * What one carboxyl group can do, read off the atom it hangs on. Ketonic decarboxylation needs an
 * enolate, so a tetrahedral alpha carbon with at least one hydrogen; the other acid needs none
 * (common practice; reviewed in acscatal-2013-cs400501h).
 *
 * @param kind the alpha atom in words
 * @param hydrogens hydrogens on it
 * @param isEnolizable whether it can give the enolate
 * @param reason why or why not
 * @param caution a reaction that wins over ketonization, where there is one
 */
record AlphaPosition(
    String kind, int hydrogens, boolean isEnolizable, String reason, Optional<String> caution) {
  private static final int NITROGEN = 7;
  private static final int OXYGEN = 8;
  private static final int SULFUR = 16;

  static AlphaPosition of(Molecule m, Carboxyl carboxyl, List<Carboxyl> all) {
    if (carboxyl.alpha().isEmpty()) {
      return blocked(
          "none", 0, "no alpha carbon: formic acid goes to CO and water or to CO2 and H2 instead");
    }
    int alpha = carboxyl.alpha().getAsInt();
    int hydrogens = m.hydrogens(alpha);
    if (m.isAromatic(alpha)) {
      return blocked(
          "aromatic ring carbon",
          hydrogens,
          "no alpha-H: the carboxyl group sits on an aromatic ring");
    }
    if (isCarboxylCarbon(alpha, all)) {
      return blocked("carboxyl carbon", hydrogens, "oxalic acid: it loses CO2 and CO instead");
    }
    Optional<String> multiple = multipleBond(m, alpha);
    if (multiple.isPresent()) {
      return unsaturated(multiple.get(), hydrogens);
    }
    return tetrahedral(m, carboxyl, alpha, all);
  }

  private static AlphaPosition tetrahedral(
      Molecule m, Carboxyl carboxyl, int alpha, List<Carboxyl> all) {
    int hydrogens = m.hydrogens(alpha);
    if (hydrogens == 0) {
      return new AlphaPosition(
          "quaternary carbon",
          0,
          false,
          "no alpha-H: the alpha carbon carries four other groups",
          caution(m, carboxyl, alpha, all));
    }
    String kind = hydrogens == 1 ? "CH" : "CH" + hydrogens;
    return new AlphaPosition(
        kind,
        hydrogens,
        true,
        "alpha " + kind + " gives the enolate",
        caution(m, carboxyl, alpha, all));
  }

  private static AlphaPosition blocked(String kind, int hydrogens, String reason) {
    return new AlphaPosition(kind, hydrogens, false, reason, Optional.empty());
  }

  private static AlphaPosition unsaturated(String kind, int hydrogens) {
    Optional<String> caution =
        "C=O carbon".equals(kind)
            ? Optional.of("an alpha-keto acid loses CO2 or CO before it ketonizes")
            : Optional.empty();
    return new AlphaPosition(kind, hydrogens, false, unsaturatedReason(kind), caution);
  }

  private static String unsaturatedReason(String kind) {
    return switch (kind) {
      case "C=O carbon" -> "no alpha-H to lose: the alpha carbon is a carbonyl";
      case "C=C carbon" -> "no alpha-H to lose: the alpha carbon is part of C=C";
      case "alkyne carbon" -> "no alpha-H: the alpha carbon is part of a triple bond";
      default -> "no alpha-H to lose: the alpha carbon is doubly bonded to a hetero atom";
    };
  }

  private static Optional<String> multipleBond(Molecule m, int alpha) {
    for (int slot = 0; slot < m.degree(alpha); slot++) {
      int order = m.order(alpha, slot);
      int other = m.element(m.neighbour(alpha, slot));
      if (order == 2) {
        return Optional.of(
            other == OXYGEN
                ? "C=O carbon"
                : other == Carboxyl.CARBON ? "C=C carbon" : "C=N carbon");
      }
      if (order > 2) {
        return Optional.of("alkyne carbon");
      }
    }
    return Optional.empty();
  }

  private static boolean isCarboxylCarbon(int atom, List<Carboxyl> all) {
    return all.stream().anyMatch(c -> c.carbon() == atom);
  }

  private static Optional<String> caution(
      Molecule m, Carboxyl carboxyl, int alpha, List<Carboxyl> all) {
    for (int slot = 0; slot < m.degree(alpha); slot++) {
      int other = m.neighbour(alpha, slot);
      if (other == carboxyl.carbon()) {
        continue;
      }
      Optional<String> found =
          isCarboxylCarbon(other, all)
              ? Optional.of("a malonic acid loses CO2 well before it ketonizes")
              : byNeighbour(m, other);
      if (found.isPresent()) {
        return found;
      }
    }
    return Optional.empty();
  }

  private static Optional<String> byNeighbour(Molecule m, int other) {
    return switch (m.element(other)) {
      case NITROGEN -> Optional.of("an alpha-amino acid loses CO2 or NH3 before it ketonizes");
      case OXYGEN ->
          Optional.of(
              m.hydrogens(other) > 0
                  ? "an alpha-hydroxy acid loses water, HCOOH or CO before it ketonizes"
                  : "an alpha-alkoxy acid is cleaved at the ether before it ketonizes");
      case SULFUR -> Optional.of("an alpha-thio acid loses H2S or CO2 before it ketonizes");
      case Carboxyl.CARBON ->
          isCarbonyl(m, other)
              ? Optional.of("an acid with a beta-carbonyl group loses CO2 well before it ketonizes")
              : Optional.empty();
      default -> Optional.of("the halogen on the alpha carbon hydrolyses before it ketonizes");
    };
  }

  private static boolean isCarbonyl(Molecule m, int carbon) {
    for (int slot = 0; slot < m.degree(carbon); slot++) {
      if (m.order(carbon, slot) == 2 && m.element(m.neighbour(carbon, slot)) == OXYGEN) {
        return true;
      }
    }
    return false;
  }
}
