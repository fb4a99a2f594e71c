package org.foreseal.thermo;

/**
 * Atom types of the group method (group additivity, common practice; the aromatic types follow this
 * project's own rule, see {@link TypedMolecule}). The label is what stands in a feature name.
 */
enum AtomType {
  /** Carbon with single bonds only. */
  ALKYL("C"),
  /** Carbon doubly bonded to oxygen. */
  CARBONYL("CO"),
  /** Carbon doubly bonded to sulfur. */
  THIOCARBONYL("CS"),
  /** Carbon doubly bonded to carbon. */
  ALKENE("Cd"),
  /** Carbon doubly bonded to nitrogen. */
  IMINE_CARBON("Ci"),
  /** Carbon triply bonded to carbon. */
  ALKYNE("Ct"),
  /** Carbon triply bonded to nitrogen. */
  NITRILE("CN"),
  /** Carbon with two double bonds. */
  CUMULENE("Ca"),
  /** Carbon of one aromatic six-membered ring. */
  AROMATIC("Cb"),
  /** Carbon of an aromatic five-membered ring only. */
  FIVE_RING("Cp"),
  /** Carbon shared by aromatic six-membered rings. */
  FUSED("Cf"),
  /** Carbon shared by aromatic rings, one of them five-membered. */
  FUSED_FIVE_RING("Cg"),
  /** Nitrogen with single bonds only. */
  AMINE("N"),
  /** Nitrogen with a double bond outside aromatic rings. */
  IMINE("Ni"),
  /** Aromatic nitrogen with a ring double bond. */
  PYRIDINE("Nb"),
  /** Aromatic nitrogen without a ring double bond. */
  PYRROLE("Nf"),
  /** Oxygen with single bonds only. */
  OXYGEN("O"),
  /** Aromatic ring oxygen. */
  FURAN("Of"),
  /** Sulfur with single bonds only. */
  SULFIDE("S"),
  /** Aromatic ring sulfur. */
  THIOPHENE("Sf"),
  /** Sulfur with one double bond, not to carbon. */
  SULFOXIDE("SO"),
  /** Sulfur with two double bonds. */
  SULFONE("SO2"),
  /** Doubly bonded oxygen, counted with its partner. */
  OXO("=O"),
  /** Sulfur doubly bonded to carbon, counted with it. */
  THIOXO("=S"),
  /** Triply bonded nitrogen, counted with its carbon. */
  NITRILE_NITROGEN("#N");

  private final String label;

  AtomType(String label) {
    this.label = label;
  }

  /** Name in features of this atom's own. */
  String label() {
    return label;
  }

  /** Name as somebody's neighbour: aromatic carbons are not told apart there. */
  String ligandLabel() {
    return isAromaticCarbon() ? AROMATIC.label : label;
  }

  /** Whether the atom has no group of its own. */
  boolean isAbsorbed() {
    return this == OXO || this == THIOXO || this == NITRILE_NITROGEN;
  }

  boolean isAromaticCarbon() {
    return this == AROMATIC || this == FIVE_RING || isFused();
  }

  boolean isFused() {
    return this == FUSED || this == FUSED_FIVE_RING;
  }

  /** Amine nitrogen or singly bonded oxygen. */
  boolean isAmineOrOxygen() {
    return this == AMINE || this == OXYGEN;
  }
}
