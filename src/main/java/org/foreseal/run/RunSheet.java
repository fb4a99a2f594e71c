package org.foreseal.run;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.rule.Provision;

/**
 * A run as the chemist means it, validated: everything that decides the chemistry, with units in
 * the names.
 *
 * @param title title of the run, may be empty
 * @param substrates what is studied, at least one
 * @param inWater whether the solvent is water; otherwise vapour phase or neat
 * @param waterGrams water charged, g
 * @param solids minerals and catalysts
 * @param additives acids, bases, salts, oxidants, gases, hydrogen donors
 * @param temperatureCelsius one or more temperatures, 0 to 600 C, ascending
 * @param pressureBar pressure, bar
 * @param durationHours time at temperature, h
 * @param depth steps from the charge to expand, 0 to 6
 * @param seed random seed
 * @param notes how the input was understood where that is not obvious
 */
public record RunSheet(
    String title,
    List<Substrate> substrates,
    boolean inWater,
    OptionalDouble waterGrams,
    List<Solid> solids,
    List<Additive> additives,
    List<Double> temperatureCelsius,
    OptionalDouble pressureBar,
    OptionalDouble durationHours,
    int depth,
    long seed,
    List<String> notes) {
  /** Keeps unmodifiable copies. */
  public RunSheet {
    substrates = List.copyOf(substrates);
    solids = List.copyOf(solids);
    additives = List.copyOf(additives);
    temperatureCelsius = List.copyOf(temperatureCelsius);
    notes = List.copyOf(notes);
  }

  /**
   * A compound under study.
   *
   * @param name name shown
   * @param molecule neutral structure
   * @param amount amount as given, with its unit
   */
  public record Substrate(String name, Molecule molecule, Optional<Amount> amount) {}

  /**
   * A mineral or catalyst.
   *
   * @param name name as given
   * @param roles what it offers
   * @param milligrams mass, mg
   * @param surfaceSquareMetresPerGram specific surface, m2/g
   */
  public record Solid(
      String name,
      Set<Provision> roles,
      OptionalDouble milligrams,
      OptionalDouble surfaceSquareMetresPerGram) {
    /** Keeps an unmodifiable copy. */
    public Solid {
      roles = Set.copyOf(roles);
    }
  }

  /**
   * Something added besides substrates and solids.
   *
   * @param name name as given
   * @param molecule its structure when it is a molecule that can react as such
   * @param roles what it offers
   * @param amount amount as given, with its unit
   */
  public record Additive(
      String name, Optional<Molecule> molecule, Set<Provision> roles, Optional<Amount> amount) {
    /** Keeps an unmodifiable copy. */
    public Additive {
      roles = Set.copyOf(roles);
    }
  }

  /**
   * An amount with the unit it was given in.
   *
   * @param value the number, positive
   * @param unit one of mol/kg, mmol, mg, bar
   */
  public record Amount(double value, String unit) {}
}
