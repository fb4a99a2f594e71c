package org.foreseal.molecule;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.foreseal.molecule.NameParts.Prefix;

/** Names what remains of a carboxylic acid without its OH: acetyl, 2-methylpropanoyl, benzoyl. */
final class Acyl {
  private Acyl() {}

  /**
   * The acyl group that hangs on a parent by its carbonyl carbon.
   *
   * @param atom the carbonyl carbon, outside rings
   * @param on the atom it hangs on
   */
  static Optional<Prefix> prefix(NameGraph g, Substituents substituents, int atom, int on) {
    int ring = ringBeyond(g, atom, on);
    if (ring >= 0) {
      return substituents.prefix(ring, atom).map(Acyl::onRing);
    }
    return g.group(atom)
        .flatMap(group -> new Chains(g, substituents, Set.of(group)).bestFrom(atom, on))
        .filter(n -> n.layout().principal().equals(List.of(1)))
        .map(Acyl::name);
  }

  private static int ringBeyond(NameGraph g, int atom, int on) {
    Molecule m = g.molecule();
    for (int k = 0; k < m.degree(atom); k++) {
      int other = m.neighbour(atom, k);
      if (other != on && g.inRing(other) && g.is(other, ChemicalElement.C)) {
        return other;
      }
    }
    return -1;
  }

  private static Prefix onRing(Prefix ring) {
    if (ring.text().endsWith("phenyl") && !ring.text().endsWith("biphenyl")) {
      String stem = ring.text().substring(0, ring.text().length() - "phenyl".length());
      return new Prefix(stem + "benzoyl", ring.complex());
    }
    return Prefix.complex(ring.bracketed() + "carbonyl");
  }

  private static Prefix name(Chains.Numbered chain) {
    ChainLayout layout = chain.layout();
    boolean acetyl = layout.length() == 2;
    String parent = layout.length() == 1 ? "formyl" : layout.stemWithBonds() + "oyl";
    parent = acetyl ? "acetyl" : parent;
    String text = layout.stereo() + NameParts.word(chain.placed(), !acetyl, parent);
    return new Prefix(text, !text.matches("[a-z]+") || !chain.placed().isEmpty());
  }
}
