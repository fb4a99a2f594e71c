package org.foreseal.thermo;

import java.util.Map;
import java.util.TreeMap;
import org.foreseal.molecule.Molecule;

/**
 * One group per atom that is not absorbed in its neighbour, named {@code centre-(ligand)n...} with
 * ligands in alphabetical order and hydrogen last; the atom types; and the bond pairs, which
 * together give the level an unknown group falls back to.
 */
final class GroupFeatures {
  private final TypedMolecule molecule;
  private final FeatureCounts counts;

  private GroupFeatures(TypedMolecule molecule, FeatureCounts counts) {
    this.molecule = molecule;
    this.counts = counts;
  }

  static void count(TypedMolecule molecule, FeatureCounts counts) {
    GroupFeatures features = new GroupFeatures(molecule, counts);
    for (int i = 0; i < molecule.graph().atomCount(); i++) {
      if (!molecule.type(i).isAbsorbed()) {
        features.countAtom(i);
      }
    }
    molecule.forEachBond((a, b, order, inRing) -> features.countBond(a, b, order));
  }

  private void countAtom(int atom) {
    Molecule graph = molecule.graph();
    AtomType type = molecule.type(atom);
    Map<String, Integer> ligands = new TreeMap<>();
    for (int k = 0; k < graph.degree(atom); k++) {
      String ligand = ligand(atom, graph.neighbour(atom, k), graph.order(atom, k));
      if (!ligand.isEmpty()) {
        ligands.merge(ligand, 1, Integer::sum);
      }
    }
    StringBuilder name = new StringBuilder("G:").append(type.label()).append('-');
    ligands.forEach((ligand, n) -> append(name, ligand, n));
    append(name, "H", graph.hydrogens(atom));
    counts.add(name.toString());
    counts.add("A:" + type.label());
    counts.add("B:" + type.label() + "|H", graph.hydrogens(atom));
  }

  private static void append(StringBuilder name, String ligand, int n) {
    if (n > 0) {
      name.append('(').append(ligand).append(')');
      if (n > 1) {
        name.append(n);
      }
    }
  }

  /** How a neighbour stands in the name of a group, empty when it is left out. */
  private String ligand(int atom, int other, int order) {
    AtomType type = molecule.type(atom);
    AtomType otherType = molecule.type(other);
    if (otherType.isAbsorbed()) {
      return "";
    }
    if (molecule.shareAromaticRing(atom, other)) {
      return ringLigand(type, otherType);
    }
    if (order == 3 || (order == 2 && isPartner(type, otherType))) {
      return order == 2 && type == AtomType.ALKENE && otherType == AtomType.CUMULENE
          ? otherType.label()
          : "";
    }
    return otherType.ligandLabel();
  }

  private static String ringLigand(AtomType type, AtomType other) {
    if (type.isFused()) {
      return other.isFused() ? other.label() : other.ligandLabel();
    }
    return other.isAromaticCarbon() ? "" : other.label();
  }

  private static boolean isPartner(AtomType a, AtomType b) {
    return (isCarbonPartner(a) && isCarbonPartner(b))
        || (a == AtomType.IMINE_CARBON && b == AtomType.IMINE)
        || (a == AtomType.IMINE && b == AtomType.IMINE_CARBON);
  }

  private static boolean isCarbonPartner(AtomType type) {
    return type == AtomType.ALKENE || type == AtomType.CUMULENE;
  }

  private void countBond(int a, int b, int order) {
    AtomType one = molecule.type(a);
    AtomType two = molecule.type(b);
    if (order != 1 || one.isAbsorbed() || two.isAbsorbed() || molecule.shareAromaticRing(a, b)) {
      return;
    }
    String first = one.ligandLabel();
    String second = two.ligandLabel();
    counts.add(
        first.compareTo(second) <= 0 ? "B:" + first + "|" + second : "B:" + second + "|" + first);
  }
}
