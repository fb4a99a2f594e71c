package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import org.foreseal.quantity.CsvTable;
import org.foreseal.quantity.Place;

/**
 * The ring parents of {@code names/ring-parents.csv} and the plain carbocycles, and where a
 * molecule holds them.
 */
final class RingParents {
  private static final int LARGEST_CARBOCYCLE = 12;

  private final List<RingParent> parents = new ArrayList<>();
  private final List<RingParent> carbocycles = new ArrayList<>();

  private RingParents() {
    for (List<String> row : CsvTable.read("/names/ring-parents.csv").rows()) {
      parents.add(parent(row.get(0), row.get(1), row.get(2).split(" "), row.get(3).equals("yes")));
    }
    for (int size = 3; size <= LARGEST_CARBOCYCLE; size++) {
      carbocycles.add(RingParent.carbocycle(size));
    }
  }

  static RingParents builtIn() {
    return BuiltIn.PARENTS;
  }

  private static RingParent parent(String name, String smiles, String[] locants, boolean fixed) {
    try {
      Fragment fragment =
          CdkBridge.fromLibrary(Smiles.parse(smiles, Place.onCommandLine(smiles, 1)))
              .build()
              .get(0);
      Integer[] order = new Integer[locants.length];
      for (int position = 0; position < locants.length; position++) {
        order[fragment.builderAtom(position)] = position;
      }
      RingParent.Kind kind =
          name.equals("benzene") ? RingParent.Kind.BENZENE : RingParent.Kind.OTHER;
      return new RingParent(
          fixed ? RingParent.Kind.FIXED : kind,
          name,
          fragment.molecule(),
          Arrays.asList(order),
          Arrays.asList(locants));
    } catch (ImpossibleStructureException e) {
      throw new IllegalStateException("ring parent " + name, e);
    }
  }

  List<RingParent> all() {
    return List.copyOf(parents);
  }

  /**
   * Every ring system of a molecule, or nothing when one is not known.
   *
   * @param fixed whether 1-indanone is to be found as such; else it is an indane with a carbonyl
   */
  Optional<List<RingSystem>> systems(Molecule m, boolean fixed) {
    List<RingSystem> result = new ArrayList<>();
    for (List<Integer> atoms : components(m)) {
      Optional<RingSystem> system = recognise(m, atoms, fixed);
      if (system.isEmpty()) {
        return Optional.empty();
      }
      result.add(system.get());
    }
    return Optional.of(joinFirstBiphenyl(m, result));
  }

  private static List<List<Integer>> components(Molecule m) {
    int[] owner = new int[m.atomCount()];
    List<List<Integer>> result = new ArrayList<>();
    for (int r = 0; r < m.ringCount(); r++) {
      for (int start : m.ring(r)) {
        if (owner[start] == 0) {
          result.add(component(m, start, result.size() + 1, owner));
        }
      }
    }
    return result;
  }

  private static List<Integer> component(Molecule m, int start, int mark, int[] owner) {
    TreeSet<Integer> found = new TreeSet<>();
    List<Integer> queue = new ArrayList<>(List.of(start));
    owner[start] = mark;
    for (int next = 0; next < queue.size(); next++) {
      int at = queue.get(next);
      found.add(at);
      for (int k = 0; k < m.degree(at); k++) {
        int other = m.neighbour(at, k);
        if (m.isRingBond(at, k) && owner[other] == 0) {
          owner[other] = mark;
          queue.add(other);
        }
      }
    }
    return new ArrayList<>(found);
  }

  private Optional<RingSystem> recognise(Molecule m, List<Integer> atoms, boolean fixed) {
    List<Integer> withOxygens = withCarbonylOxygens(m, atoms);
    if (fixed && withOxygens.size() > atoms.size()) {
      Optional<RingSystem> found = first(m, withOxygens, true);
      if (found.isPresent()) {
        return found;
      }
    }
    return first(m, atoms, false).or(() -> carbocycle(m, atoms));
  }

  private Optional<RingSystem> first(Molecule m, List<Integer> atoms, boolean fixed) {
    return parents.stream()
        .filter(p -> fixed == (p.kind() == RingParent.Kind.FIXED))
        .flatMap(p -> match(m, p, atoms).stream())
        .findFirst();
  }

  private static Optional<RingSystem> match(Molecule m, RingParent parent, List<Integer> atoms) {
    List<int[]> numberings = RingMatcher.numberings(m, parent, atoms);
    return numberings.isEmpty()
        ? Optional.empty()
        : Optional.of(new RingSystem(parent, atoms, numberings));
  }

  private static List<Integer> withCarbonylOxygens(Molecule m, List<Integer> ring) {
    TreeSet<Integer> all = new TreeSet<>(ring);
    for (int atom : ring) {
      for (int k = 0; k < m.degree(atom); k++) {
        int other = m.neighbour(atom, k);
        if (m.order(atom, k) == 2 && m.element(other) == 8 && m.degree(other) == 1) {
          all.add(other);
        }
      }
    }
    return new ArrayList<>(all);
  }

  private Optional<RingSystem> carbocycle(Molecule m, List<Integer> atoms) {
    boolean plain = atoms.size() <= LARGEST_CARBOCYCLE;
    int bonds = 0;
    for (int atom : atoms) {
      plain &= m.element(atom) == 6 && !m.isAromatic(atom);
      for (int k = 0; k < m.degree(atom); k++) {
        bonds += m.isRingBond(atom, k) ? 1 : 0;
        plain &= !m.isRingBond(atom, k) || m.order(atom, k) < 3;
      }
    }
    if (!plain || bonds != 2 * atoms.size()) {
      return Optional.empty();
    }
    return Optional.of(
        new RingSystem(carbocycles.get(atoms.size() - 3), atoms, rotations(m, atoms)));
  }

  private static List<int[]> rotations(Molecule m, List<Integer> atoms) {
    int n = atoms.size();
    int[] cycle = new int[n];
    cycle[0] = atoms.get(0);
    int before = -1;
    for (int i = 1; i < n; i++) {
      int at = cycle[i - 1];
      for (int k = m.degree(at) - 1; k >= 0; k--) {
        if (m.isRingBond(at, k) && m.neighbour(at, k) != before) {
          cycle[i] = m.neighbour(at, k);
        }
      }
      before = at;
    }
    List<int[]> result = new ArrayList<>();
    for (int shift = 0; shift < n; shift++) {
      int[] forward = new int[n];
      int[] backward = new int[n];
      for (int i = 0; i < n; i++) {
        forward[i] = cycle[(shift + i) % n];
        backward[i] = cycle[(shift - i + n) % n];
      }
      result.add(forward);
      result.add(backward);
    }
    return result;
  }

  /** Two benzene rings on one another are one parent, as chemists say biphenyl. */
  private List<RingSystem> joinFirstBiphenyl(Molecule m, List<RingSystem> systems) {
    for (int a = 0; a < systems.size(); a++) {
      for (int b = a + 1; b < systems.size(); b++) {
        if (systems.get(a).isBenzene() && systems.get(b).isBenzene()) {
          List<Integer> union = new ArrayList<>(systems.get(a).atoms());
          union.addAll(systems.get(b).atoms());
          Optional<RingSystem> joined = match(m, biphenyl(), union);
          if (joined.isPresent()) {
            List<RingSystem> result = new ArrayList<>(systems);
            result.set(a, joined.get());
            result.remove(b);
            return result;
          }
        }
      }
    }
    return systems;
  }

  private RingParent biphenyl() {
    return parents.stream()
        .filter(p -> p.name().equals("biphenyl"))
        .findFirst()
        .orElseThrow(() -> new IllegalStateException("biphenyl is not in the table"));
  }

  /** Loads the table on first use. */
  private static final class BuiltIn {
    static final RingParents PARENTS = new RingParents();
  }
}
