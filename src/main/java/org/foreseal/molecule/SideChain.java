package org.foreseal.molecule;

import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.foreseal.molecule.NameParts.Prefix;

/** Names a carbon chain that hangs on a parent by its first atom. */
final class SideChain {
  /** The short names chemists use for the systematic ones. */
  private static final Map<String, String> SHORT =
      Map.of(
          "1-methylethyl", "isopropyl",
          "1,1-dimethylethyl", "tert-butyl",
          "2-methylpropyl", "isobutyl",
          "1-methylpropyl", "sec-butyl",
          "phenylmethyl", "benzyl");

  private SideChain() {}

  static Optional<Prefix> prefix(NameGraph g, Substituents substituents, int atom, int on) {
    return new Chains(g, substituents, Set.of()).bestFrom(atom, on).map(SideChain::name);
  }

  /** Hexylidene, benzylidene: what hangs on by a double bond. */
  static Optional<Prefix> ylidene(NameGraph g, Substituents substituents, int atom, int on) {
    return new Chains(g, substituents, Set.of())
        .bestFrom(atom, on)
        .map(
            chain -> {
              Prefix single = name(chain);
              return new Prefix(single.text() + "idene", single.complex());
            });
  }

  private static Prefix name(Chains.Numbered chain) {
    ChainLayout layout = chain.layout();
    String base =
        layout.isSaturated()
            ? NameParts.stem(layout.length()) + "yl"
            : layout.stemWithBonds() + "yl";
    String plain = NameParts.word(chain.placed(), layout.length() > 1, base);
    String text = layout.stereo() + SHORT.getOrDefault(plain, plain);
    boolean simple = SHORT.containsKey(plain) || (chain.placed().isEmpty() && text.equals(base));
    return new Prefix(text, !simple || !Character.isLetter(text.charAt(0)));
  }
}
