package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Map;

/** Carries out one transformation at one site and keeps track of where every atom goes. */
final class SiteEdit {
  private final List<Molecule> reactants;
  private final MoleculeBuilder builder = new MoleculeBuilder();
  private final int reactantAtoms;
  private final int[] atomOf;
  private final boolean[] hydrogen;
  private final int[] home;
  private final List<int[]> moves = new ArrayList<>();

  SiteEdit(
      List<Molecule> reactants, List<ReactantPiece> pieces, List<int[]> matches, int mapCount) {
    this.reactants = reactants;
    atomOf = new int[mapCount];
    hydrogen = new boolean[mapCount];
    home = new int[mapCount];
    for (int p = 0; p < pieces.size(); p++) {
      int offset = builder.append(reactants.get(p));
      place(reactants.get(p), offset, pieces.get(p), matches.get(p));
    }
    reactantAtoms = builder.atomCount();
  }

  private void place(Molecule reactant, int offset, ReactantPiece piece, int[] match) {
    for (int i = 0; i < match.length; i++) {
      int map = piece.mapOf(i);
      int code = match[i];
      int atom = offset + (code < 0 ? ~code : code);
      hydrogen[map] = AtomFacts.isHydrogen(reactant, code);
      atomOf[map] = atom;
      home[map] = atom;
    }
  }

  void apply(
      List<Transformation.BondEdit> edits, Map<Integer, Integer> newCharges, boolean[] bare) {
    for (Transformation.BondEdit edit : edits) {
      if (edit.order() == 0) {
        cut(edit.a(), edit.b());
      }
    }
    for (Transformation.BondEdit edit : edits) {
      if (edit.order() != 0) {
        make(edit);
      }
    }
    for (int i = 0; i < bare.length; i++) {
      if (bare[i] && hydrogen[i]) {
        move(i, builder.addAtom(1, newCharges.getOrDefault(i, 0), 0));
      }
    }
    newCharges.forEach(
        (i, q) -> {
          if (!hydrogen[i]) {
            builder.setCharge(atomOf[i], q);
          }
        });
  }

  private void cut(int a, int b) {
    if (hydrogen[a] && hydrogen[b]) {
      builder.changeHydrogens(atomOf[a], -1);
      builder.removeAtom(atomOf[a]);
    } else if (hydrogen[a] || hydrogen[b]) {
      builder.changeHydrogens(atomOf[hydrogen[a] ? b : a], -1);
    } else {
      builder.setOrder(atomOf[a], atomOf[b], 0);
    }
  }

  private void make(Transformation.BondEdit edit) {
    int a = edit.a();
    int b = edit.b();
    if (hydrogen[a] && hydrogen[b]) {
      int atom = builder.addAtom(1, 0, 1);
      move(a, atom);
      move(b, atom);
    } else if (hydrogen[a] || hydrogen[b]) {
      moveOnto(hydrogen[a] ? a : b, atomOf[hydrogen[a] ? b : a], edit.before());
    } else {
      builder.setOrder(atomOf[a], atomOf[b], edit.order());
    }
  }

  private void moveOnto(int mappedHydrogen, int atom, boolean alreadyThere) {
    if (!alreadyThere) {
      builder.changeHydrogens(atom, 1);
      move(mappedHydrogen, atom);
    }
  }

  private void move(int mappedHydrogen, int to) {
    moves.add(new int[] {home[mappedHydrogen], to});
  }

  /** The products with their key. */
  record Result(String key, Outcome outcome) {}

  Result result() throws ImpossibleStructureException {
    List<Fragment> fragments = new ArrayList<>(builder.build());
    fragments.sort(Comparator.comparing(Fragment::molecule));
    checkBalance(fragments);
    StringBuilder key = new StringBuilder();
    List<Molecule> products = new ArrayList<>();
    for (Fragment f : fragments) {
      products.add(f.molecule());
      key.append(f.molecule().key()).append('\uffff');
    }
    return new Result(key.toString(), new Outcome(products, atomMap(fragments), 1));
  }

  private AtomMap atomMap(List<Fragment> fragments) {
    int[] productAtom = new int[builder.atomCount()];
    Arrays.fill(productAtom, -1);
    int total = fragments.stream().mapToInt(f -> f.molecule().atomCount()).sum();
    short[] origin = new short[total];
    int next = 0;
    for (Fragment f : fragments) {
      for (int i = 0; i < f.molecule().atomCount(); i++) {
        int from = f.builderAtom(i);
        productAtom[from] = next;
        origin[next++] = (short) (from < reactantAtoms ? from : -1);
      }
    }
    short[] hydrogenMoves = new short[moves.size() * 2];
    for (int i = 0; i < moves.size(); i++) {
      hydrogenMoves[2 * i] = (short) moves.get(i)[0];
      hydrogenMoves[2 * i + 1] = (short) productAtom[moves.get(i)[1]];
    }
    return new AtomMap(origin, hydrogenMoves);
  }

  /**
   * Heavy atoms cannot get lost; hydrogens and charge are counted, in case a template sets a charge
   * it may not.
   */
  private void checkBalance(List<Fragment> fragments) throws ImpossibleStructureException {
    int hydrogens = 0;
    int charge = 0;
    for (Molecule m : reactants) {
      hydrogens += hydrogensOf(m);
      charge += m.netCharge();
    }
    for (Fragment f : fragments) {
      hydrogens -= hydrogensOf(f.molecule());
      charge -= f.molecule().netCharge();
    }
    if (hydrogens != 0 || charge != 0) {
      throw new ImpossibleStructureException("hydrogens or charge do not balance at this site");
    }
  }

  private static int hydrogensOf(Molecule m) {
    int total = 0;
    for (int i = 0; i < m.atomCount(); i++) {
      total += m.hydrogens(i) + (m.element(i) == 1 ? 1 : 0);
    }
    return total;
  }
}
