package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Takes a SMIRKS apart: reactant pieces, the bonds that change, the charges that are set. */
final class SmirksText {
  private final String smirks;
  private final Map<Integer, Integer> dense = new TreeMap<>();
  private final List<ReactantPiece> pieces = new ArrayList<>();
  private final Map<Long, QueryGraph.Written> before = new LinkedHashMap<>();
  private final Map<Long, QueryGraph.Written> after = new LinkedHashMap<>();
  private final Map<Integer, Integer> newCharges = new TreeMap<>();
  private final Map<Integer, Integer> elementBefore = new TreeMap<>();
  private final Map<Integer, Integer> productMaps = new TreeMap<>();

  private SmirksText(String smirks) {
    this.smirks = smirks;
  }

  static SmirksText parse(String smirks) {
    String[] sides = smirks.split(">>", -1);
    if (sides.length != 2 || sides[0].isBlank() || sides[1].isBlank()) {
      throw new IllegalArgumentException("a SMIRKS has reactants, '>>' and products");
    }
    SmirksText text = new SmirksText(smirks);
    for (String piece : SmartsPieces.split(sides[0])) {
      text.readReactant(QueryCompiler.compile(piece));
    }
    for (String piece : SmartsPieces.split(sides[1])) {
      text.readProduct(QueryCompiler.compile(piece));
    }
    text.checkProductsComplete();
    return text;
  }

  private void readReactant(QueryGraph graph) {
    int[] mapOf = new int[graph.atoms().size()];
    for (int i = 0; i < mapOf.length; i++) {
      QueryGraph.Atom atom = graph.atoms().get(i);
      int map = requireMap(atom);
      if (dense.containsKey(map)) {
        throw new IllegalArgumentException(
            "map number " + map + " stands twice among the reactants");
      }
      mapOf[i] = dense.size();
      dense.put(map, mapOf[i]);
      atom.element().ifPresent(e -> elementBefore.put(map, e));
    }
    for (QueryGraph.Bond bond : graph.bonds()) {
      before.put(pair(mapOf[bond.from()], mapOf[bond.to()]), bond.written());
    }
    pieces.add(new ReactantPiece(QueryPlan.of(graph), mapOf));
  }

  private void readProduct(QueryGraph graph) {
    int[] indexOf = new int[graph.atoms().size()];
    for (int i = 0; i < indexOf.length; i++) {
      QueryGraph.Atom atom = graph.atoms().get(i);
      int map = requireMap(atom);
      Integer index = dense.get(map);
      if (index == null) {
        throw new IllegalArgumentException("map number " + map + " is only among the products");
      }
      indexOf[i] = index;
      if (productMaps.put(map, index) != null) {
        throw new IllegalArgumentException(
            "map number " + map + " stands twice among the products");
      }
      Integer element = elementBefore.get(map);
      if (element != null && atom.element().isPresent() && atom.element().getAsInt() != element) {
        throw new IllegalArgumentException("map number " + map + " changes its element");
      }
      atom.charge().ifPresent(q -> newCharges.put(index, q));
    }
    for (QueryGraph.Bond bond : graph.bonds()) {
      after.put(pair(indexOf[bond.from()], indexOf[bond.to()]), bond.written());
    }
  }

  private void checkProductsComplete() {
    for (int map : dense.keySet()) {
      if (!productMaps.containsKey(map)) {
        throw new IllegalArgumentException("map number " + map + " is only among the reactants");
      }
    }
  }

  private static int requireMap(QueryGraph.Atom atom) {
    if (atom.map() <= 0) {
      throw new IllegalArgumentException(
          "every atom of a SMIRKS needs a map number, moving hydrogens too");
    }
    return atom.map();
  }

  private static long pair(int a, int b) {
    return (long) Math.min(a, b) << 32 | Math.max(a, b);
  }

  String smirks() {
    return smirks;
  }

  int mapCount() {
    return dense.size();
  }

  List<ReactantPiece> pieces() {
    return List.copyOf(pieces);
  }

  Map<Integer, Integer> newCharges() {
    return newCharges;
  }

  /**
   * Bonds that are cut, made or given another order; cuts first, so that valences never overflow on
   * the way.
   */
  List<Transformation.BondEdit> edits() {
    List<Transformation.BondEdit> result = new ArrayList<>();
    for (Map.Entry<Long, QueryGraph.Written> old : before.entrySet()) {
      if (!after.containsKey(old.getKey())) {
        result.add(edit(old.getKey(), true, 0));
      }
    }
    for (Map.Entry<Long, QueryGraph.Written> now : after.entrySet()) {
      QueryGraph.Written old = before.get(now.getKey());
      if (old == null || (old != now.getValue() && now.getValue() != QueryGraph.Written.OTHER)) {
        if (now.getValue().order() == 0) {
          throw new IllegalArgumentException("a new bond needs a definite order");
        }
        result.add(edit(now.getKey(), old != null, now.getValue().order()));
      }
    }
    return result;
  }

  private static Transformation.BondEdit edit(long pair, boolean existed, int order) {
    return new Transformation.BondEdit((int) (pair >> 32), (int) pair, existed, order);
  }

  /**
   * Dense indices of atoms with no bond at all on the product side: a hydrogen there becomes a
   * proton.
   */
  boolean[] bareHydrogens() {
    boolean[] bare = new boolean[dense.size()];
    Arrays.fill(bare, true);
    for (long pair : after.keySet()) {
      bare[(int) (pair >> 32)] = false;
      bare[(int) pair] = false;
    }
    return bare;
  }
}
