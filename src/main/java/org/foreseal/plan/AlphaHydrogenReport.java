package org.foreseal.plan;

import java.util.List;
import java.util.Optional;
import org.foreseal.molecule.Molecule;

/**
 * Which acids own an alpha hydrogen, and which ketones follow.
 *
 * @param acids in the order asked for
 * @param ketones every pair, also of an acid with itself, by first and then second acid
 */
public record AlphaHydrogenReport(List<Acid> acids, List<Ketone> ketones) {
  /** Keeps unmodifiable copies. */
  public AlphaHydrogenReport {
    acids = List.copyOf(acids);
    ketones = List.copyOf(ketones);
  }

  /**
   * One acid.
   *
   * @param name name shown
   * @param molecule its structure
   * @param alphaCarbons the neighbours of its carboxyl groups, each once
   * @param alphaHydrogens hydrogens on them that an enolate can lose
   * @param canGiveEnolate whether it can take part as the enolate
   * @param reason why, in plain words
   * @param cautions reactions that such an acid prefers; empty for plain ones
   */
  public record Acid(
      String name,
      Molecule molecule,
      List<AlphaCarbon> alphaCarbons,
      int alphaHydrogens,
      boolean canGiveEnolate,
      String reason,
      List<String> cautions) {
    /** Keeps unmodifiable copies. */
    public Acid {
      alphaCarbons = List.copyOf(alphaCarbons);
      cautions = List.copyOf(cautions);
    }
  }

  /**
   * The atom a carboxyl group hangs on.
   *
   * @param kind such as CH2, quaternary carbon, aromatic ring carbon
   * @param hydrogens all hydrogens on it, also those an enolate cannot lose
   */
  public record AlphaCarbon(String kind, int hydrogens) {}

  /**
   * What two acids give together.
   *
   * @param first index of one acid, from 0
   * @param second index of the other, not smaller
   * @param ketone the ketone, when there is one
   * @param name its name, empty without a ketone
   * @param reason which acid gives what, or why there is no ketone
   */
  public record Ketone(
      int first, int second, Optional<Molecule> ketone, String name, String reason) {
    /** Whether this ketone can form. */
    public boolean isPossible() {
      return ketone.isPresent();
    }
  }
}
