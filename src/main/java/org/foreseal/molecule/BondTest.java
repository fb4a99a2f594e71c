package org.foreseal.molecule;

/** A condition on one bond: localised order, aromatic or not, in a ring or not. */
@FunctionalInterface
interface BondTest {
  boolean accepts(int order, boolean aromatic, boolean inRing);
}
