package org.foreseal.chromatography;

import java.util.List;
import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Formula;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Pattern;

/**
 * Rules of thumb for where a product goes when the vessel is opened and its water is extracted, and
 * whether it passes a GC column as it is. Common practice, no fitted numbers: hydrocarbons and
 * ethers of up to four carbons and the inorganic gases leave with the gas; a molecule with fewer
 * than three carbons for every strongly polar group (hydroxyl, carboxyl, amino, amide) stays in the
 * water; amino acids, di- and hydroxy acids, sugars and ions do not elute underivatized.
 */
public final class WorkUp {
  private static final int LARGEST_GAS_CARBONS = 4;
  private static final int CARBONS_PER_POLAR_GROUP = 3;

  private static final Pattern POLAR =
      Pattern.of(
          "[$([OX2H1,OX1-]),$([NX3;!$(N-C=O);!$(N=O);!$(N-c)]),$([NX3H2]-C=O),$([SX4](=O)=O)]");
  private static final Pattern HYDROXYL = Pattern.of("[OX2H1][CX4]");
  private static final List<Pattern> NOT_ELUTED =
      List.of(
          Pattern.of("[NX3;H1,H2;!$(N-C=O)][CX4][CX3](=O)[OX2H1]"),
          Pattern.of("[OX2H1][CX4][CX3](=O)[OX2H1]"),
          Pattern.of("[CX3](=O)[CX3](=O)[OX2H1]"),
          Pattern.of("[CX3](=O)([OX2H1])[#6].[CX3](=O)([OX2H1])[#6]"),
          Pattern.of("[SX4](=O)(=O)[OX2H1]"),
          Pattern.of("[OX2][OX2]"),
          Pattern.of("[OX2H1][CX3](=O)[NX3,OX2]"),
          Pattern.of("[#6][CX3](=O)[CX4][CX3](=O)[OX2H1]"));

  private WorkUp() {}

  /** Where most of it is found. */
  public static WhereFound whereFound(Molecule molecule) {
    if (isGas(molecule)) {
      return WhereFound.GAS;
    }
    int carbons = molecule.formula().count(ChemicalElement.C);
    boolean watery =
        molecule.netCharge() != 0 || carbons < CARBONS_PER_POLAR_GROUP * POLAR.count(molecule);
    return watery || carbons == 0 ? WhereFound.WATER : WhereFound.EXTRACT;
  }

  /**
   * Whether it reaches the detector of a liquid-injection GC method underivatized and gives a peak
   * there.
   */
  public static boolean isSeenByGc(Molecule molecule) {
    return whereFound(molecule) == WhereFound.EXTRACT && passesColumn(molecule);
  }

  private static boolean passesColumn(Molecule molecule) {
    return HYDROXYL.count(molecule) < 3 && NOT_ELUTED.stream().noneMatch(p -> p.isIn(molecule));
  }

  private static boolean isGas(Molecule molecule) {
    Formula f = molecule.formula();
    int carbons = f.count(ChemicalElement.C);
    int heavy = molecule.heavyAtomCount();
    if (molecule.netCharge() != 0) {
      return false;
    }
    if (carbons == 0) {
      return heavy <= 2 && !(f.count(ChemicalElement.O) == 1 && heavy == 1);
    }
    boolean oxide = carbons == 1 && f.count(ChemicalElement.H) == 0;
    boolean hydrocarbon = heavy == carbons && carbons <= LARGEST_GAS_CARBONS;
    boolean formaldehydeOrThiol =
        heavy == 2 && !HYDROXYL.isIn(molecule) && f.count(ChemicalElement.N) == 0;
    return oxide || hydrocarbon || formaldehydeOrThiol;
  }
}
