package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.openscience.cdk.graph.ConnectivityChecker;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;

/**
 * Makes one neutral molecule of a parsed structure: sets counter-ions and water of crystallisation
 * aside, neutralises the rest, and refuses mixtures.
 */
final class InputStructure {
  private static final int MOST_HEAVY_ATOMS = 60;

  /** Acids whose anion, or which themselves beside an amine, count as counter-ions. */
  private static final Map<String, String> ACIDS =
      Map.of(
          Smiles.read("F").key(), "fluoride",
          Smiles.read("Cl").key(), "chloride",
          Smiles.read("Br").key(), "bromide",
          Smiles.read("I").key(), "iodide",
          Smiles.read("OS(=O)(=O)O").key(), "sulfate",
          Smiles.read("O[N+](=O)[O-]").key(), "nitrate",
          Smiles.read("OP(=O)(O)O").key(), "phosphate");

  /** Property under which every atom carries its place in the text through the partition. */
  private static final String OFFSET = "foreseal.offset";

  /** Li, Na, K, Rb, Cs, Mg, Ca, Sr, Ba. */
  private static final Set<Integer> SALT_METALS = Set.of(3, 11, 19, 37, 55, 12, 20, 38, 56);

  private static final String WATER = Smiles.read("O").key();

  private final IAtomContainer container;
  private final int[] offsets;
  private final Place start;
  private final Set<String> notes = new LinkedHashSet<>();

  /**
   * One connected part, as drawn and neutral.
   *
   * @param charged true when it was drawn with a net charge
   * @param offset where it begins in the text
   */
  private record Part(Molecule neutral, List<String> notes, boolean charged, int offset) {
    boolean hasCarbon() {
      return neutral.formula().count(ChemicalElement.C) > 0;
    }
  }

  private InputStructure(IAtomContainer container, int[] offsets, Place start) {
    this.container = container;
    this.offsets = offsets;
    this.start = start;
  }

  /**
   * The molecule and its notes.
   *
   * @param molecule neutral and flat
   * @param notes what was set aside or changed
   */
  record Result(Molecule molecule, List<String> notes) {}

  static Result read(IAtomContainer container, int[] offsets, Place start) {
    return new InputStructure(container, offsets, start).run();
  }

  private Result run() {
    InputAtoms atoms = new InputAtoms(container, offsets, start);
    atoms.checkKinds();
    boolean rewritten = PentavalentNitrogen.rewrite(container);
    atoms.checkBonds();
    if (container.stereoElements().iterator().hasNext()) {
      notes.add("stereochemistry is set aside: all stereoisomers count as one species");
    }
    if (rewritten) {
      notes.add("nitrogen drawn with five bonds is taken charge-separated, as in [N+](=O)[O-]");
    }
    refuseOrganometallic();
    for (IAtom atom : container.atoms()) {
      atom.setProperty(OFFSET, atom.getIndex() < offsets.length ? offsets[atom.getIndex()] : 0);
    }
    List<Part> parts = new ArrayList<>();
    boolean metal = false;
    for (IAtomContainer piece :
        ConnectivityChecker.partitionIntoMolecules(container).atomContainers()) {
      IAtom first = piece.getAtom(0);
      if (InputAtoms.isMetalIon(first)) {
        metal = true;
        notes.add(metalName(first) + " counter-ion set aside");
      } else {
        parts.add(part(piece));
      }
    }
    return choose(parts, metal);
  }

  /** Ferrocene and its like are written as ions; only the salts of real carbanions are salts. */
  private void refuseOrganometallic() {
    boolean carbanion = false;
    for (IAtom atom : container.atoms()) {
      carbanion |= atom.getAtomicNumber() == 6 && InputAtoms.charge(atom) < 0;
    }
    for (IAtom atom : container.atoms()) {
      if (carbanion
          && InputAtoms.isMetalIon(atom)
          && !SALT_METALS.contains(atom.getAtomicNumber())) {
        throw new BadInputException(
            InputAtoms.shifted(start, 0),
            "a metal-carbon compound of " + atom.getSymbol(),
            "give a metal or mineral as a solid");
      }
    }
  }

  private static String metalName(IAtom ion) {
    return switch (ion.getSymbol()) {
      case "Li" -> "lithium";
      case "Na" -> "sodium";
      case "K" -> "potassium";
      case "Cs" -> "caesium";
      case "Mg" -> "magnesium";
      case "Ca" -> "calcium";
      case "Ba" -> "barium";
      case "Zn" -> "zinc";
      default -> ion.getSymbol();
    };
  }

  private Part part(IAtomContainer piece) {
    int offset = offsetOf(piece.getAtom(0));
    long heavy = 0;
    for (IAtom atom : piece.atoms()) {
      heavy += atom.getAtomicNumber() == 1 ? 0 : 1;
    }
    if (heavy > MOST_HEAVY_ATOMS) {
      throw tooLarge(heavy, InputAtoms.shifted(start, offset));
    }
    try {
      List<Fragment> fragments = CdkBridge.fromLibrary(piece).build();
      Molecule drawn = fragments.get(0).molecule();
      Neutralizer.Neutral neutral = Neutralizer.of(drawn);
      List<String> all = new ArrayList<>(neutral.notes());
      if (hydroxyls(piece) > hydroxyls(drawn)) {
        all.add("drawn as an enol; taken as the carbonyl form");
      }
      return new Part(neutral.molecule(), all, drawn.netCharge() != 0, offset);
    } catch (ImpossibleStructureException e) {
      throw new BadInputException(
          InputAtoms.shifted(start, offset),
          "not a neutral molecule: " + e.getMessage(),
          "check valences and charges; a permanently charged ion has no neutral form here,"
              + " give the neutral compound it comes from");
    }
  }

  static BadInputException tooLarge(long heavyAtoms, Place place) {
    return new BadInputException(
        place,
        heavyAtoms + " heavy atoms in one molecule",
        "the largest taken is " + MOST_HEAVY_ATOMS);
  }

  private static int hydroxyls(IAtomContainer piece) {
    int total = 0;
    for (IAtom atom : piece.atoms()) {
      if (atom.getAtomicNumber() == 8) {
        total += InputAtoms.hydrogens(atom);
        for (IBond bond : atom.bonds()) {
          total += bond.getOther(atom).getAtomicNumber() == 1 ? 1 : 0;
        }
      }
    }
    return total;
  }

  private static int hydroxyls(Molecule m) {
    int total = 0;
    for (int i = 0; i < m.atomCount(); i++) {
      total += m.element(i) == 8 ? m.hydrogens(i) : 0;
    }
    return total;
  }

  private int offsetOf(IAtom atom) {
    Object mark = atom.getProperty(OFFSET);
    return mark instanceof Integer at ? at : 0;
  }

  private Result choose(List<Part> parts, boolean metal) {
    boolean organic = parts.stream().anyMatch(Part::hasCarbon);
    List<Part> kept = new ArrayList<>();
    for (Part part : parts) {
      boolean aside = parts.size() > 1 && organic && !part.hasCarbon() && setAside(part, parts);
      boolean known = kept.stream().anyMatch(k -> k.neutral().equals(part.neutral()));
      if (!aside && !known) {
        kept.add(part);
      }
    }
    refuseSalt(kept, metal);
    if (kept.size() > 1) {
      throw new BadInputException(
          InputAtoms.shifted(start, kept.get(1).offset()),
          kept.size() + " different molecules in one text",
          "give each molecule as a substrate or additive of its own");
    }
    notes.addAll(kept.get(0).notes());
    return new Result(kept.get(0).neutral(), List.copyOf(notes));
  }

  private boolean setAside(Part part, List<Part> all) {
    String key = part.neutral().key();
    if (key.equals(WATER) && !part.charged()) {
      notes.add("water of crystallisation set aside");
      return true;
    }
    String anion = ACIDS.get(key);
    boolean basic =
        all.stream()
            .anyMatch(p -> p.hasCarbon() && p.neutral().formula().count(ChemicalElement.N) > 0);
    if (anion != null && (part.charged() || basic)) {
      notes.add(anion + " counter-ion set aside");
      return true;
    }
    return false;
  }

  private void refuseSalt(List<Part> kept, boolean metal) {
    boolean carbonate = kept.size() == 1 && kept.get(0).neutral().equals(Smiles.read("OC(=O)O"));
    boolean noCarbon = kept.stream().noneMatch(Part::hasCarbon);
    if (kept.isEmpty() || (metal && (carbonate || noCarbon))) {
      throw new BadInputException(
          InputAtoms.shifted(start, 0),
          "an inorganic salt or a bare ion, no molecule to follow",
          "give a mineral as a solid and a salt as an additive");
    }
  }
}
