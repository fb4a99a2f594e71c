package org.foreseal.molecule;

import java.util.Optional;

/**
 * Builds systematic names of simple families in the form chemists say them ("2-methyl-3-hexanone",
 * "1-phenyl-2-propanol", "hexyl hexanoate"): one chain or one known ring system as the parent, the
 * most senior group as the suffix, everything else as prefixes. A molecule with any atom beyond
 * these rules has no name here; a name is never a guess. Follows the common practice of
 * substitutive nomenclature, from memory; a test reads every name back.
 */
final class GeneratedName {
  private final NameGraph g;
  private final ChainName chain;
  private final RingName ring;
  private final FunctionalClassName functionalClass;

  private GeneratedName(NameGraph g) {
    Substituents substituents = new Substituents(g);
    this.g = g;
    chain = new ChainName(g, substituents);
    ring = new RingName(g, substituents);
    functionalClass = new FunctionalClassName(g, substituents);
  }

  static Optional<String> of(Molecule molecule) {
    if (molecule.netCharge() != 0 || molecule.formula().count(ChemicalElement.C) == 0) {
      return Optional.empty();
    }
    Optional<NameGraph> graph = NameGraph.of(molecule, true);
    Optional<String> name = graph.flatMap(g -> new GeneratedName(g).name());
    boolean fixed = graph.map(GeneratedName::hasFixedParent).orElse(false);
    return fixed
        ? name.or(() -> NameGraph.of(molecule, false).flatMap(g -> new GeneratedName(g).name()))
        : name;
  }

  private static boolean hasFixedParent(NameGraph g) {
    return g.systems().stream().anyMatch(RingSystem::isFixed);
  }

  private Optional<String> name() {
    Optional<PrincipalGroup> senior = senior();
    if (hasFixedParent(g)) {
      boolean lower = senior.map(s -> s.compareTo(PrincipalGroup.KETONE) >= 0).orElse(true);
      return lower ? ring.plain().map(RingName.Plain::text) : Optional.empty();
    }
    if (senior.isEmpty()) {
      return functionalClass.name().or(this::unfunctional);
    }
    PrincipalGroup group = senior.get();
    Optional<String> amine =
        group == PrincipalGroup.AMINE ? functionalClass.name() : Optional.empty();
    boolean ringFirst = ring.count(group) >= chain.count(group);
    return amine
        .or(() -> ringFirst ? ring.of(group) : chain.of(group))
        .or(() -> ringFirst ? chain.of(group) : ring.of(group));
  }

  private Optional<PrincipalGroup> senior() {
    PrincipalGroup best = null;
    for (int i = 0; i < g.molecule().atomCount(); i++) {
      PrincipalGroup here = g.group(i).orElse(null);
      if (here != null && (best == null || here.compareTo(best) < 0)) {
        best = here;
      }
    }
    return Optional.ofNullable(best);
  }

  /** A ring with simple substituents, else the chain that carries the rings: diphenylalkanes. */
  private Optional<String> unfunctional() {
    Optional<RingName.Plain> onRing = ring.plain();
    Optional<String> simple = onRing.filter(RingName.Plain::onlySimple).map(RingName.Plain::text);
    return simple.or(chain::plain).or(() -> onRing.map(RingName.Plain::text));
  }
}
