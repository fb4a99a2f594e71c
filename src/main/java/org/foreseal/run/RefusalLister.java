package org.foreseal.run;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Molecule;
import org.foreseal.network.Network;
import org.foreseal.network.Refusal;

/**
 * Turns refused steps into the list of what is not expected, one line per product, the clearest
 * reason first.
 */
final class RefusalLister {
  private static final Comparator<Refusal> BY_CLARITY =
      Comparator.comparingInt((Refusal r) -> clarity(r.kind())).thenComparingInt(Refusal::depth);

  private RefusalLister() {}

  private static int clarity(Refusal.Kind kind) {
    return switch (kind) {
      case NEAR_MISS -> 0;
      case NEED -> 1;
      case GIBBS -> 2;
      case GUARD -> 3;
      case LIMIT -> 4;
    };
  }

  static List<RuledOut> list(Network network, int most, Function<Molecule, String> names) {
    List<Refusal> sorted = new ArrayList<>(network.refusals());
    sorted.sort(BY_CLARITY);
    Map<Molecule, RuledOut> byProduct = new LinkedHashMap<>();
    for (Refusal refusal : sorted) {
      for (Molecule product : refusal.products()) {
        if (byProduct.size() < most
            && isWorthNaming(product)
            && network.find(product).isEmpty()
            && !byProduct.containsKey(product)) {
          byProduct.put(product, ruledOut(refusal, product, names));
        }
      }
    }
    return List.copyOf(byProduct.values());
  }

  private static boolean isWorthNaming(Molecule m) {
    return m.formula().count(ChemicalElement.C) > 0;
  }

  private static RuledOut ruledOut(
      Refusal refusal, Molecule product, Function<Molecule, String> names) {
    return new RuledOut(
        product.smiles(),
        names.apply(product),
        refusal.rule().id(),
        refusal.reason(),
        refusal.detail());
  }
}
