package org.foreseal.molecule;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/**
 * Takes a drawn charge state back to the neutral molecule, atom by atom: an anion gains its
 * hydrogen, an ammonium-like cation loses one. A cation without hydrogen keeps its charge when a
 * negative atom sits beside it (nitro, N-oxide, azide, isocyanide, carbon monoxide); with sulfur or
 * phosphorus such a pair becomes a double bond, since S=O and S(+)-O(-) are one species.
 */
final class Neutralizer {
  private final Molecule m;
  private final MoleculeBuilder builder = new MoleculeBuilder();
  private final int[] charge;
  private final boolean[] paired;
  private final Set<String> notes = new LinkedHashSet<>();

  private Neutralizer(Molecule m) {
    this.m = m;
    builder.append(m);
    charge = new int[m.atomCount()];
    paired = new boolean[m.atomCount()];
    for (int i = 0; i < charge.length; i++) {
      charge[i] = m.charge(i);
    }
  }

  /**
   * A neutral molecule and what was done to it.
   *
   * @param molecule neutral
   * @param notes in plain words
   */
  record Neutral(Molecule molecule, List<String> notes) {}

  /**
   * The neutral form.
   *
   * @throws ImpossibleStructureException when the charge cannot be taken away
   */
  static Neutral of(Molecule molecule) throws ImpossibleStructureException {
    return new Neutralizer(molecule).run();
  }

  private Neutral run() throws ImpossibleStructureException {
    boolean anyCharge = false;
    for (int i = 0; i < charge.length; i++) {
      anyCharge |= charge[i] != 0;
      closeOntoHeavyCentre(i);
    }
    if (!anyCharge) {
      return new Neutral(m, List.of());
    }
    for (int i = 0; i < charge.length; i++) {
      writeDiazoOneWay(i);
    }
    for (int i = 0; i < charge.length; i++) {
      pair(i);
    }
    for (int i = 0; i < charge.length; i++) {
      if (!paired[i]) {
        shiftHydrogens(i);
      }
      builder.setCharge(i, charge[i]);
    }
    return new Neutral(builder.build().get(0).molecule(), List.copyOf(notes));
  }

  /** S(+)-O(-) becomes S=O, P(+)-C(-) becomes P=C. */
  private void closeOntoHeavyCentre(int atom) {
    boolean heavy = is(atom, ChemicalElement.S) || is(atom, ChemicalElement.P);
    for (int k = 0; heavy && k < m.degree(atom); k++) {
      int other = m.neighbour(atom, k);
      if (charge[atom] > 0 && charge[other] < 0) {
        builder.setOrder(atom, other, builder.order(atom, other) + 1);
        charge[atom]--;
        charge[other]++;
        notes.add("a charge-separated S-O or P-O bond is taken as a double bond");
      }
    }
  }

  /** X(-)-N(+)#N becomes X=N(+)=N(-), the other way to draw a diazo group or an azide. */
  private void writeDiazoOneWay(int atom) {
    boolean carrier = is(atom, ChemicalElement.C) || is(atom, ChemicalElement.N);
    for (int k = 0; carrier && charge[atom] == -1 && k < m.degree(atom); k++) {
      int middle = m.neighbour(atom, k);
      int end = tripleBondedNitrogen(middle);
      if (m.order(atom, k) == 1 && charge[middle] == 1 && end >= 0) {
        builder.setOrder(atom, middle, 2);
        builder.setOrder(middle, end, 2);
        charge[atom] = 0;
        charge[end] = -1;
      }
    }
  }

  private int tripleBondedNitrogen(int middle) {
    for (int k = 0; is(middle, ChemicalElement.N) && k < m.degree(middle); k++) {
      int end = m.neighbour(middle, k);
      if (m.order(middle, k) == 3 && is(end, ChemicalElement.N) && charge[end] == 0) {
        return end;
      }
    }
    return -1;
  }

  private void pair(int atom) {
    for (int k = 0; k < m.degree(atom); k++) {
      int other = m.neighbour(atom, k);
      boolean free = charge[atom] == 1 && m.hydrogens(atom) == 0 && !paired[atom];
      if (free && charge[other] == -1 && !paired[other]) {
        paired[atom] = true;
        paired[other] = true;
      }
    }
  }

  private void shiftHydrogens(int atom) throws ImpossibleStructureException {
    if (charge[atom] < 0) {
      if (is(atom, ChemicalElement.H)) {
        throw new ImpossibleStructureException("a hydride ion is no molecule");
      }
      builder.changeHydrogens(atom, -charge[atom]);
    } else if (charge[atom] > 0) {
      boolean acidic =
          is(atom, ChemicalElement.N)
              || is(atom, ChemicalElement.O)
              || is(atom, ChemicalElement.S)
              || is(atom, ChemicalElement.P);
      if (!acidic || m.hydrogens(atom) < charge[atom]) {
        throw new ImpossibleStructureException(
            "a permanent positive charge on " + ChemicalElement.require(m.element(atom)).symbol());
      }
      builder.changeHydrogens(atom, -charge[atom]);
    }
    if (charge[atom] != 0) {
      notes.add("drawn ionised; taken as the neutral molecule");
      charge[atom] = 0;
    }
  }

  private boolean is(int atom, ChemicalElement e) {
    return m.element(atom) == e.atomicNumber();
  }
}
