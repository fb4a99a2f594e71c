package org.foreseal.network;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.rule.AmbientSpecies;
import org.foreseal.rule.Provision;
import org.foreseal.rule.RuleLibrary;
import org.foreseal.rule.Surroundings;

/** Networks for tests: hot water with an iron oxide, the built-in rules. */
final class Networks {
  static final RuleLibrary LIBRARY = RuleLibrary.builtIn();

  private Networks() {}

  static Network grow(Limits limits, String... substrates) {
    return grow(
        limits, EnumSet.of(Provision.WATER, Provision.OXIDE, Provision.IRON_BEARING), substrates);
  }

  static Network grow(Limits limits, Set<Provision> offered, String... substrates) {
    List<Molecule> charge = new ArrayList<>();
    for (String s : substrates) {
      charge.add(Smiles.read(s));
    }
    Set<Provision> all = EnumSet.copyOf(offered);
    all.addAll(Set.of(Provision.HYDROGEN, Provision.ACID));
    Surroundings run = new Surroundings(all, new LinkedHashSet<>(charge), 300, 300);
    charge.add(AmbientSpecies.WATER);
    charge.add(AmbientSpecies.HYDROGEN);
    if (charge.stream().anyMatch(m -> m.formula().toString().contains("N"))) {
      charge.add(AmbientSpecies.AMMONIA);
    }
    return new NetworkExpansion(LIBRARY, run, StepPruner.NONE, limits, n -> {}).grow(charge);
  }

  /** Everything a network says, as text. */
  static String written(Network network) {
    StringBuilder text = new StringBuilder();
    network
        .species()
        .forEach(
            s ->
                text.append(s.id())
                    .append(' ')
                    .append(s.depth())
                    .append(' ')
                    .append(s.molecule().smiles())
                    .append('\n'));
    for (Step step : network.steps()) {
      text.append(step.rule().id())
          .append(java.util.Arrays.toString(step.reactants()))
          .append(java.util.Arrays.toString(step.products()))
          .append(step.sites())
          .append('\n');
    }
    network
        .refusals()
        .forEach(
            r -> text.append(r.rule().id()).append(r.products()).append(r.reason()).append('\n'));
    return text.append(network.stoppedBy()).toString();
  }
}
