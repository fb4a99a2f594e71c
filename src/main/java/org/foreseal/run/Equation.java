package org.foreseal.run;

import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.foreseal.molecule.Molecule;
import org.foreseal.network.Network;
import org.foreseal.network.Step;

/** Writes a step as a balanced equation, equal molecules counted, the largest product first. */
final class Equation {
  private Equation() {}

  static String of(Network network, Step step, Function<Molecule, String> name) {
    return side(network.reactantsOf(step), name) + " = " + side(network.productsOf(step), name);
  }

  private static String side(List<Molecule> molecules, Function<Molecule, String> name) {
    Map<Molecule, Integer> counts = new LinkedHashMap<>();
    molecules.stream()
        .sorted(Comparator.reverseOrder())
        .forEach(m -> counts.merge(m, 1, Integer::sum));
    return counts.entrySet().stream()
        .map(e -> (e.getValue() > 1 ? e.getValue() + " " : "") + name.apply(e.getKey()))
        .collect(Collectors.joining(" + "));
  }
}
