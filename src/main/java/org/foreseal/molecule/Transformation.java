package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A compiled SMIRKS: finds its reactant patterns, one per molecule, and edits bonds, hydrogens and
 * charges. All sites are tried; results with the same products are merged and counted.
 *
 * <p>The text maps every atom, hydrogens that move included ({@code [H:n]}), and carries the same
 * numbers on both sides, so elements balance by construction. A bond without a symbol on both sides
 * stays as it is; otherwise the product side sets its order. Reactant pieces match separate
 * molecules; a reaction inside one molecule is a template of one piece.
 */
public final class Transformation {
  private final String smirks;
  private final List<ReactantPiece> pieces;
  private final List<BondEdit> edits;
  private final Map<Integer, Integer> newCharges;
  private final int mapCount;
  private final boolean[] hydrogenAlone;

  private Transformation(SmirksText text) {
    smirks = text.smirks();
    mapCount = text.mapCount();
    pieces = text.pieces();
    edits = text.edits();
    newCharges = text.newCharges();
    hydrogenAlone = text.bareHydrogens();
  }

  /**
   * A bond whose order differs between the sides.
   *
   * @param a dense map index of one end
   * @param b dense map index of the other
   * @param before whether the bond exists on the reactant side
   * @param order order on the product side, 0 for none
   */
  record BondEdit(int a, int b, boolean before, int order) {}

  /**
   * Compiles a SMIRKS.
   *
   * @throws IllegalArgumentException saying what is wrong: it does not parse, an atom has no map
   *     number, or the sides do not carry the same atoms
   */
  public static Transformation of(String smirks) {
    return new Transformation(SmirksText.parse(smirks));
  }

  /** Number of reactant molecules it takes. */
  public int reactantCount() {
    return pieces.size();
  }

  /** Whether this molecule has a site for the given reactant piece, numbered from 0. */
  public boolean hasSite(int piece, Molecule molecule) {
    return pieces.get(piece).find(molecule, match -> true);
  }

  /**
   * Every distinct outcome for these reactants, given in the order of the pieces. Sites whose
   * result would be no molecule are passed over. Products are normalised (keto form).
   *
   * @throws IllegalArgumentException when the number of reactants differs from {@link
   *     #reactantCount()}
   */
  public List<Outcome> apply(List<Molecule> reactants) {
    if (reactants.size() != pieces.size()) {
      throw new IllegalArgumentException(
          pieces.size() + " reactants wanted, " + reactants.size() + " given");
    }
    Map<String, Outcome> found = new LinkedHashMap<>();
    applyFrom(0, reactants, new ArrayList<>(), found);
    return List.copyOf(found.values());
  }

  private void applyFrom(
      int piece, List<Molecule> reactants, List<int[]> matches, Map<String, Outcome> found) {
    if (piece == pieces.size()) {
      edit(reactants, matches, found);
      return;
    }
    pieces
        .get(piece)
        .find(
            reactants.get(piece),
            match -> {
              matches.add(match);
              applyFrom(piece + 1, reactants, matches, found);
              matches.remove(matches.size() - 1);
              return false;
            });
  }

  private void edit(List<Molecule> reactants, List<int[]> matches, Map<String, Outcome> found) {
    SiteEdit site = new SiteEdit(reactants, pieces, matches, mapCount);
    try {
      site.apply(edits, newCharges, hydrogenAlone);
      SiteEdit.Result result = site.result();
      found.merge(
          result.key(),
          result.outcome(),
          (old, same) -> new Outcome(old.products(), old.atomMap(), old.sites() + 1));
    } catch (ImpossibleStructureException e) {
      // The template does not fit this site (valence, broken ring alternation): not a reaction.
      return;
    }
  }

  @Override
  public String toString() {
    return smirks;
  }
}
