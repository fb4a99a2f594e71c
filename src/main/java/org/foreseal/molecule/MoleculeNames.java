package org.foreseal.molecule;

import java.util.List;
import java.util.Optional;

/**
 * Names a chemist would say: first a curated list of common names, then names built for simple
 * families, else nothing. A name stands for the flat species; where E and Z exist it shows the more
 * stable one: "trans-stilbene", "(E)-2-hexene". Built names carry "(E)-" only on double bonds with
 * one hydrogen at each end, where E is trans and trans is the stable isomer; on more substituted
 * ones neither is known to be, so they carry none.
 */
public final class MoleculeNames {
  private final CommonNames common = new CommonNames();

  private MoleculeNames() {}

  /** The names in this program; loaded once, unchangeable. */
  public static MoleculeNames builtIn() {
    return BuiltIn.NAMES;
  }

  /** A curated or built name, or nothing when neither is certain. */
  public Optional<String> commonOrGenerated(Molecule molecule) {
    return common.find(molecule).map(CommonNames.Entry::name).or(() -> GeneratedName.of(molecule));
  }

  /** The name, or the formula where there is none. */
  public String display(Molecule molecule) {
    return commonOrGenerated(molecule).orElseGet(() -> molecule.formula().toString());
  }

  /** SMILES of the isomer that the curated name means, for the molecules that have several. */
  public Optional<String> stereoSmiles(Molecule molecule) {
    return common.find(molecule).map(CommonNames.Entry::stereoSmiles).filter(s -> !s.isEmpty());
  }

  Optional<CommonNames.Entry> curated(String name) {
    return common.find(name);
  }

  List<String> closest(String name) {
    return common.closest(name);
  }

  /** Loads the list on first use. */
  private static final class BuiltIn {
    static final MoleculeNames NAMES = new MoleculeNames();
  }
}
