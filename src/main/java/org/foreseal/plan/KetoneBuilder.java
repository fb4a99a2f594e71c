package org.foreseal.plan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.foreseal.molecule.Fragment;
import org.foreseal.molecule.ImpossibleStructureException;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.MoleculeBuilder;

/**
 * Builds the ketone of ketonic decarboxylation, 2 RCOOH = R2CO + CO2 + H2O: the enolate loses its
 * carboxyl group and takes the acyl group of the other acid in its place.
 */
final class KetoneBuilder {
  private static final int SMALLEST_RING = 5;
  private static final int LARGEST_RING = 6;

  private KetoneBuilder() {}

  /** The ketone of two molecules. */
  static Molecule between(Molecule enolate, Carboxyl lost, Molecule acyl, Carboxyl kept) {
    MoleculeBuilder builder = new MoleculeBuilder();
    int first = builder.append(enolate);
    int second = builder.append(acyl);
    return join(builder, first, lost, second, kept);
  }

  /**
   * The ring ketone of a diacid whose chain closes to a ring of five or six, if there is one:
   * adipic acid gives cyclopentanone.
   *
   * @param enolizable whether each carboxyl group may be the one that is lost
   */
  static Optional<Molecule> ring(Molecule acid, List<Carboxyl> groups, List<Boolean> enolizable) {
    for (int i = 0; i < groups.size(); i++) {
      for (int j = 0; j < groups.size(); j++) {
        if (i != j && enolizable.get(i)) {
          int size = ringSize(acid, groups.get(i), groups.get(j));
          if (size >= SMALLEST_RING && size <= LARGEST_RING) {
            MoleculeBuilder builder = new MoleculeBuilder();
            int at = builder.append(acid);
            return Optional.of(join(builder, at, groups.get(i), at, groups.get(j)));
          }
        }
      }
    }
    return Optional.empty();
  }

  /** Atoms of the ring closed between the alpha carbon of one group and the carbon of the other. */
  private static int ringSize(Molecule m, Carboxyl lost, Carboxyl kept) {
    OptionalInt start = lost.alpha();
    if (start.isEmpty()) {
      return 0;
    }
    int[] distance = new int[m.atomCount()];
    int[] queue = new int[m.atomCount()];
    int tail = 0;
    distance[start.getAsInt()] = 1;
    queue[tail++] = start.getAsInt();
    for (int head = 0; head < tail; head++) {
      int at = queue[head];
      for (int slot = 0; slot < m.degree(at); slot++) {
        int next = m.neighbour(at, slot);
        if (distance[next] == 0) {
          distance[next] = distance[at] + 1;
          queue[tail++] = next;
        }
      }
    }
    return distance[kept.carbon()];
  }

  private static Molecule join(
      MoleculeBuilder builder, int first, Carboxyl lost, int second, Carboxyl kept) {
    int alpha = first + lost.alpha().orElseThrow();
    int lostCarbon = first + lost.carbon();
    int acylCarbon = second + kept.carbon();
    builder.setOrder(alpha, lostCarbon, 0);
    remove(builder, lostCarbon, first + lost.oxo());
    remove(builder, lostCarbon, first + lost.hydroxyl());
    builder.removeAtom(lostCarbon);
    remove(builder, acylCarbon, second + kept.hydroxyl());
    builder.setOrder(alpha, acylCarbon, 1);
    return single(builder);
  }

  private static void remove(MoleculeBuilder builder, int from, int atom) {
    builder.setOrder(from, atom, 0);
    builder.removeAtom(atom);
  }

  private static Molecule single(MoleculeBuilder builder) {
    try {
      List<Fragment> pieces = builder.build();
      if (pieces.size() != 1) {
        throw new IllegalStateException(pieces.size() + " pieces where one ketone is wanted");
      }
      return pieces.get(0).molecule();
    } catch (ImpossibleStructureException e) {
      throw new IllegalStateException("a ketone of two acids has impossible valences", e);
    }
  }
}
