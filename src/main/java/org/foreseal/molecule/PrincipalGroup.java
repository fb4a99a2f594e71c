package org.foreseal.molecule;

/** Groups that can be the suffix of a name, the most senior first. */
enum PrincipalGroup {
  ACID("oic acid", "carboxylic acid"),
  ESTER("oate", "carboxylate"),
  AMIDE("amide", "carboxamide"),
  NITRILE("nitrile", "carbonitrile"),
  ALDEHYDE("al", "carbaldehyde"),
  KETONE("one", "one"),
  ALCOHOL("ol", "ol"),
  THIOL("thiol", "thiol"),
  AMINE("amine", "amine");

  private final String chainSuffix;
  private final String ringSuffix;

  PrincipalGroup(String chainSuffix, String ringSuffix) {
    this.chainSuffix = chainSuffix;
    this.ringSuffix = ringSuffix;
  }

  /** Suffix on a chain, its carbon (if it has one) being part of the chain. */
  String chainSuffix() {
    return chainSuffix;
  }

  /** Suffix on a ring, its carbon (if it has one) standing outside the ring. */
  String ringSuffix() {
    return ringSuffix;
  }

  /** The group ends a chain: its carbon is number one. */
  boolean isTerminal() {
    return compareTo(ALDEHYDE) <= 0;
  }

  /** The group's own carbon may stay in a chain when it is not the suffix (as oxo). */
  boolean staysInChainAsPrefix() {
    return this == ALDEHYDE || this == KETONE;
  }
}
